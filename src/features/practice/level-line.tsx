import { useStore } from '@nanostores/react';
import type { LevelView } from '../../../shared/contracts/practice.ts';
import { practiceMessages } from '../../i18n/practice.ts';
import { levelMessages, topicMessages } from '../../i18n/words.ts';
import { SightTube } from '../../ui/sight-tube.tsx';

/** Where the topic stands after an answer that counted: its tube, small, and the state in words. */
export function LevelLine({ level }: { level: LevelView }) {
  const t = useStore(practiceMessages);
  const topics = useStore(topicMessages);
  const states = useStore(levelMessages);
  return (
    <p className="mt-2 flex items-center gap-2 text-sm text-ink-soft">
      <SightTube level={level} className="h-10 w-auto" />
      {t.level({ topic: topics[level.topic], state: states[level.state] })}
    </p>
  );
}
