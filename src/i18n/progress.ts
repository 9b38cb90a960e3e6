import { count, params } from '@nanostores/i18n';
import { i18n } from './i18n.ts';

export const progressMessages = i18n('progress', {
  title: 'Progress',
  empty: 'Nothing to show yet. Work a drill: after three answers on a topic its level appears here.',
  toDrills: 'Choose a drill',
  totals: params('{right} of {answered} first answers right, {minutes} minutes of work.'),
  levels: 'Levels by topic',
  topic: 'Topic',
  state: 'State',
  fill: 'Right in 100, likely range',
  answers: 'Answers',
  blank: 'too few answers',
  range2: params('{low} to {high}'),
  days: 'Answers by day',
  daysChart: params('Bars: first answers a day, the filled part right. {days} days, most {most} on one day.'),
  showTable: 'Show as table',
  day: 'Day',
  answered: 'Answered',
  right: 'Right',
  slips: 'Slips you made',
  noSlips: 'No known slips in your first answers so far.',
  slip: 'Slip',
  kind: 'Kind of problem',
  times: 'Times',
  last: 'Last',
  timesCount: count({ one: 'once', other: '{count} times' }),
});
