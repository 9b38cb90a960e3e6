import type { ComponentProps } from 'react';

/** A white sheet on the tank's milky white; `graduated` where work is done on it. */
export function Sheet({
  graduated = false,
  className = '',
  ...rest
}: ComponentProps<'section'> & { graduated?: boolean }) {
  const edge = graduated ? 'graduated pr-4 wide:pr-6' : 'px-4 wide:px-6';
  return <section {...rest} className={`border border-rule bg-sheet py-4 wide:py-5 ${edge} ${className}`} />;
}
