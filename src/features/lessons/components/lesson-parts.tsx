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

/** Everything a lesson's text may use besides plain Markdown. */
export const lessonParts = {
  a: Anchor,
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
