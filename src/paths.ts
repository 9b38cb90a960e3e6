// Every address of the client, once: the pattern the router matches and the builder that makes a link.

export const patterns = {
  welcome: '/',
  signUp: '/sign-up',
  signIn: '/sign-in',
  lookInYourMail: '/look-in-your-mail',
  confirm: '/confirm',
  forgot: '/forgot',
  reset: '/reset',
  mailbox: '/mailbox',
  today: '/today',
  course: '/course',
  lesson: '/course/:topic/:slug',
  drills: '/drills',
  drill: '/drills/:drillId',
  problem: '/problems/:problemId',
  progress: '/progress',
  account: '/account',
  families: '/staff/families',
  family: '/staff/families/:family',
} as const;

export const paths = {
  ...patterns,
  lesson: (topic: string, slug: string) => `/course/${topic}/${slug}`,
  /** The drill form with one topic already chosen. */
  drillsOn: (topic: string) => `/drills?topic=${topic}`,
  drill: (drillId: string) => `/drills/${drillId}`,
  problem: (problemId: string) => `/problems/${problemId}`,
  family: (family: string) => `/staff/families/${family}`,
  /** Where to sign in, coming back to `next` afterwards. */
  signInThen: (next: string) => `/sign-in?next=${encodeURIComponent(next)}`,
} as const;
