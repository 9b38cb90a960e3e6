import { useStore } from '@nanostores/react';
import type { ComponentProps } from 'react';
import { Link } from 'react-router';
import { lessonMessages } from '../../../i18n/lessons.ts';
import { ScrollBox } from '../../../ui/scroll-box.tsx';
import { AtTheTank, Caution, Compare, Figure, PracticeLabel, Steps, TryIt, WorkedExample } from './blocks.tsx';
import { Checkpoint } from './checkpoint.tsx';

/** Links inside the product stay in it; others open as links do. */
function Anchor({ href = '', children, ...rest }: ComponentProps<'a'>) {
  if (href.startsWith('/')) return <Link to={href}>{children}</Link>;
  return (
    <a href={href} {...rest}>
      {children}
    </a>
  );
}

/** A wide table scrolls inside its own frame, never the page. */
function Table(props: ComponentProps<'table'>) {
  const { table } = useStore(lessonMessages);
  return (
    <ScrollBox label={table} className="my-5">
      <table {...props} />
    </ScrollBox>
  );
}

function WideFormula(props: ComponentProps<'span'>) {
  const { formula } = useStore(lessonMessages);
  // It scrolls where it is wider than a phone, so it must be reachable by keyboard (WCAG 2.1.1); a paragraph holds no div.
  // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex, jsx-a11y/prefer-tag-over-role
  return <span {...props} role="group" aria-label={formula} tabIndex={0} />;
}

/** Formulas come as spans; those on a line of their own may be wider than the page. */
function Span(props: ComponentProps<'span'>) {
  return props.className === 'katex-display' ? <WideFormula {...props} /> : <span {...props} />;
}

/** Everything a lesson's text may use besides plain Markdown. */
export const lessonParts = {
  a: Anchor,
  span: Span,
  table: Table,
  AtTheTank,
  Caution,
  Checkpoint,
  Compare,
  Figure,
  PracticeLabel,
  Steps,
  TryIt,
  WorkedExample,
};
