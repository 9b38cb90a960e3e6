import { useStore } from '@nanostores/react';
import type { LevelView } from '../../../shared/contracts/practice.ts';
import { todayMessages } from '../../i18n/today.ts';
import { levelMessages, topicMessages } from '../../i18n/words.ts';
import { Chip } from '../../ui/chip.tsx';
import { levelTones, SightTube } from '../../ui/sight-tube.tsx';

function inHundred(share: number): number {
  return Math.round(share * 100);
}

/** One topic: tube, name, state in words, and the figure where there is one. */
export function TopicTube({ level }: { level: LevelView }) {
  const t = useStore(todayMessages);
  const topics = useStore(topicMessages);
  const states = useStore(levelMessages);
  const figure =
    level.fill !== null && level.range !== null
      ? t.level({ fill: inHundred(level.fill), low: inHundred(level.range.low), high: inHundred(level.range.high) })
      : null;
  const small =
    figure ?? (level.tiers.length === 0 ? t.noProblems : level.answers > 0 ? t.answers(level.answers) : t.none);
  return (
    <div className="flex items-start gap-2.5">
      <SightTube level={level} />
      <div className="min-w-0 pt-1">
        <p className="leading-tight font-semibold">{topics[level.topic]}</p>
        <p className="mt-1">
          <Chip tone={levelTones[level.state]}>{states[level.state]}</Chip>
        </p>
        <p className="mt-0.5 text-[0.8125rem] leading-tight text-ink-soft">{small}</p>
      </div>
    </div>
  );
}

/** All topics as tubes, in the order of the course. */
export function TopicTubes({ levels }: { levels: readonly LevelView[] }) {
  return (
    <ul className="grid grid-cols-2 gap-x-3 gap-y-5 sm:grid-cols-3 wide:grid-cols-[repeat(auto-fill,minmax(11.5rem,1fr))]">
      {levels.map((level) => (
        <li key={level.topic}>
          <TopicTube level={level} />
        </li>
      ))}
    </ul>
  );
}
