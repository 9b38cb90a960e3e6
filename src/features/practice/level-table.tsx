import { useStore } from '@nanostores/react';
import type { ReactNode } from 'react';
import type { LevelView } from '../../../shared/contracts/practice.ts';
import { progressMessages } from '../../i18n/progress.ts';
import { levelMessages, topicMessages } from '../../i18n/words.ts';
import { Chip } from '../../ui/chip.tsx';
import { DataTable } from '../../ui/data-table.tsx';
import { levelTones } from '../../ui/sight-tube.tsx';

function inHundred(share: number): number {
  return Math.round(share * 100);
}

function stateChip(state: LevelView['state'], word: string) {
  return <Chip tone={levelTones[state]}>{word}</Chip>;
}

/** The topic, and on phones its state under it. */
function withState(topic: string, chip: ReactNode) {
  return (
    <>
      {topic} <span className="block wide:hidden">{chip}</span>
    </>
  );
}

function soft(text: string) {
  return <span className="text-sm whitespace-normal text-ink-soft">{text}</span>;
}

function withRange(fill: string, range: string) {
  return (
    <>
      <b>{fill}</b> <span className="inline-block text-sm text-ink-soft wide:ml-2 wide:min-w-20">{range}</span>
    </>
  );
}

/** Every topic's level with its likely range; blank where there are too few answers to say. */
export function LevelTable({ levels }: { levels: readonly LevelView[] }) {
  const t = useStore(progressMessages);
  const topics = useStore(topicMessages);
  const states = useStore(levelMessages);
  return (
    <DataTable
      caption={t.levels}
      rows={levels}
      rowKey={(level) => level.topic}
      columns={[
        {
          key: 'topic',
          head: t.topic,
          cell: ({ topic, state }) => withState(topics[topic], stateChip(state, states[state])),
        },
        {
          key: 'state',
          head: t.state,
          wideOnly: true,
          cell: ({ state }) => stateChip(state, states[state]),
        },
        {
          key: 'fill',
          head: t.fill,
          number: true,
          cell: ({ fill, range }) =>
            fill !== null && range
              ? withRange(String(inHundred(fill)), t.range2({ low: inHundred(range.low), high: inHundred(range.high) }))
              : soft(t.blank),
        },
        { key: 'answers', head: t.answers, number: true, cell: (level) => level.answers },
      ]}
    />
  );
}
