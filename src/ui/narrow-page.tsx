import type { ReactNode } from 'react';
import { PageHeading } from './page.tsx';
import { Sheet } from './sheet.tsx';

interface NarrowPageProps {
  title: string;
  text?: string;
  children: ReactNode;
  below?: ReactNode;
}

/** A page with one small form: a heading, a sheet, and where else to go. */
export function NarrowPage({ title, text, children, below }: NarrowPageProps) {
  return (
    <div className="mx-auto max-w-[30rem]">
      <PageHeading title={title}>{text !== undefined && <p className="mt-2 font-serif">{text}</p>}</PageHeading>
      <Sheet>{children}</Sheet>
      {below !== undefined && <div className="mt-4 grid gap-2">{below}</div>}
    </div>
  );
}
