import { i18n } from './i18n.ts';

export const lessonPartMessages = i18n('lesson-parts', {
  worked: 'Worked example',
  tank: 'At the tank',
  caution: 'Caution',
  describe: 'Describe the drawing',
});
