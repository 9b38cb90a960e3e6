import type { ReactNode } from 'react';

/** What may be wider than its column scrolls inside its own frame, by keyboard too; the page itself never does. */
export function ScrollBox({
  label,
  className = '',
  children,
}: {
  label: string;
  className?: string;
  children: ReactNode;
}) {
  const look = `overflow-x-auto overflow-y-hidden ${className}`;
  // A box that scrolls must be reachable by keyboard (WCAG 2.1.1), so it takes the focus though it is no control; and it is
  // a group, not a fieldset of a form.
  return (
    // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex, jsx-a11y/prefer-tag-over-role
    <div role="group" aria-label={label} tabIndex={0} className={look}>
      {children}
    </div>
  );
}
