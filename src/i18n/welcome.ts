import { i18n } from './i18n.ts';

export const welcomeMessages = i18n('welcome', {
  documentTitle: 'Training for the pesticide applicator exam',
  headline: 'Know the sum before you fill the tank.',
  lead: 'Lessons and fresh problems for the pesticide applicator exam, for landscape and grounds crews. When an answer is wrong, Tankmark tells you which mistake it was.',
  create: 'Create an account',
  toToday: 'Go to Today',
  workNow: 'Work a problem now',
  sampleTitle: 'Work one now',
  sampleHelp: 'No account needed. Nothing you enter here is kept.',
  another: 'Another problem',
  what: 'What you do here',
  learn: 'Learn it',
  learnText:
    'Short lessons in plain words, on your phone: measuring a site, rates, tools and units, nozzles, calibration.',
  work: 'Work it',
  workText:
    'Problems with new numbers each time, drawn to scale, from practice labels. Answers count with their units.',
  know: 'Know where you stand',
  knowText:
    'A level for each topic, with its likely range, from your own answers. The slips you make are named and counted.',
  forWhom: 'For whom',
  trainees: 'Trainees',
  traineesText: 'You take the written exam and want the arithmetic to be second nature. English or Spanish.',
  alone: 'People who study alone',
  aloneText: 'You work at your own pace: lessons, drills, and a worked solution for every problem.',
  families: 'People who teach',
  familiesText: 'You can work every problem yourself and see the slips that trainees make.',
  standing:
    'Tankmark prepares for examinations; it does not license anyone. Practice labels and numbers are invented. On the job the label on the container is the law, and your state’s rules can be stricter: ask the state lead agency. In an emergency call 911; poison center 1-800-222-1222.',
});
