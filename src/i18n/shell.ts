import { params } from '@nanostores/i18n';
import { i18n } from './i18n.ts';

export const shellMessages = i18n('shell', {
  skip: 'Skip to the content',
  main: 'Main',
  today: 'Today',
  course: 'Course',
  drills: 'Drills',
  progress: 'Progress',
  account: 'Account',
  families: 'Families',
  mailbox: 'Mailbox',
  signIn: 'Sign in',
  signUp: 'Create an account',
  welcome: 'Tankmark, welcome page',
  loading: 'Loading',
  title: params('{page} · Tankmark'),
  notFoundTitle: 'There is nothing at this address',
  notFoundText: 'The link may be old, or a letter of it is missing.',
  forbiddenTitle: 'This page is not for your account',
  forbiddenText: 'Your account does not have the role it needs. Ask the office of your school if it should.',
  brokenTitle: 'This page could not be shown',
  brokenText: 'Nothing you entered is lost. Try again; if it stays so, tell us what you did.',
  offlineText: 'The server cannot be reached. Check your connection, then try again.',
  tryAgain: 'Try again',
  goToToday: 'Go to Today',
  goToWelcome: 'Go to the welcome page',
  caution:
    'Practice numbers only. On the job, the label on the container is the law; your state’s rules can be stricter. Ask your state lead agency.',
});
