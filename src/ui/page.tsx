import { useStore } from '@nanostores/react';
import { useEffect, useRef, type ReactNode } from 'react';
import { shellMessages } from '../i18n/shell.ts';

/** Gives the document its title. */
export function useDocumentTitle(page: string): void {
  const { title } = useStore(shellMessages);
  const text = title({ page });
  useEffect(() => {
    document.title = text;
  }, [text]);
}

/** A page's heading: gives the document its title and takes the focus when the page is come to. */
export function PageHeading({ title, above, children }: { title: string; above?: ReactNode; children?: ReactNode }) {
  const heading = useRef<HTMLHeadingElement>(null);
  useDocumentTitle(title);
  useEffect(() => {
    // The first page of a visit keeps the browser's own focus; later ones are announced by their heading.
    if (window.history.state?.idx > 0) heading.current?.focus({ preventScroll: true });
  }, []);
  return (
    <header className="mb-5">
      {above !== undefined && <p className="mb-1 text-sm text-ink-soft">{above}</p>}
      <h1 ref={heading} tabIndex={-1}>
        {title}
      </h1>
      {children}
    </header>
  );
}
