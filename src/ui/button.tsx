import type { ComponentProps } from 'react';
import { Link } from 'react-router';

type Look = 'main' | 'quiet' | 'plain' | 'danger';

const shape =
  'inline-flex min-h-11 items-center justify-center gap-2 rounded-[3px] py-2 font-bold no-underline disabled:opacity-60 disabled:cursor-default';
const looks: Record<Look, string> = {
  main: 'px-[1.1rem] bg-dye text-on-dye hover:bg-dye-deep',
  quiet: 'px-[1.1rem] border-[1.5px] border-dye text-dye-deep bg-transparent hover:bg-dye-wash',
  plain: 'px-1 font-semibold text-dye underline underline-offset-4 hover:text-dye-deep',
  danger: 'px-[1.1rem] border-[1.5px] border-clay text-clay bg-transparent hover:bg-clay-wash',
};

/** The look of a button, for what is a link to a file. */
export function buttonLook(look: Look): string {
  return `${shape} ${looks[look]}`;
}

export function Button({ look = 'main', className = '', ...rest }: ComponentProps<'button'> & { look?: Look }) {
  return <button type="button" {...rest} className={`${shape} ${looks[look]} ${className}`} />;
}

export function ButtonLink({ look = 'main', className = '', ...rest }: ComponentProps<typeof Link> & { look?: Look }) {
  return <Link {...rest} className={`${shape} ${looks[look]} ${className}`} />;
}
