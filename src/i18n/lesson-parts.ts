import { i18n } from './i18n.ts';

export const lessonPartMessages = i18n('lesson-parts', {
  worked: 'Worked example',
  tank: 'At the tank',
  // Not "Caution", which on a label is a signal word with a meaning of its own.
  caution: 'Take care',
  describe: 'Describe the drawing',
});
