import { count, params } from '@nanostores/i18n';
import { i18n } from './i18n.ts';

export const todayMessages = i18n('today', {
  morning: params('Good morning, {name}.'),
  afternoon: params('Good afternoon, {name}.'),
  evening: params('Good evening, {name}.'),
  openTitle: 'Pick up where you left off',
  openDrill: params('A drill on {topics}: {done} of {length} done'),
  goOn: 'Go on',
  suggestTitle: 'A drill for today',
  suggestText: params('Five problems, about ten minutes, on {topics}.'),
  suggestWhyNew: 'You have not worked these yet.',
  suggestWhyLow: 'These are your lowest topics.',
  start: 'Start the drill',
  chooseOwn: 'Choose topics yourself',
  firstTitle: 'Start here',
  firstText:
    'Read one short lesson on measuring a site, then work five problems. After three answers on a topic its tube shows where you stand.',
  firstLesson: 'Read the first lesson',
  topicsTitle: 'Your topics',
  topicsHelp:
    'The red line is the mark: right on 8 of 10 ordinary problems. The faint band is the range you likely stand in.',
  level: params('{fill} in 100, likely {low} to {high}'),
  answers: count({ one: '{count} answer', other: '{count} answers' }),
  none: 'no answers yet',
  noProblems: 'problems to come',
  and: params('{first} and {last}'),
});
