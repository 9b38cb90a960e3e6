/** What a person can be allowed to do, one key a row of the access table (`server/http/access.ts`). */
export const accessKeys = [
  'welcome',
  'course',
  'own-work',
  'answers-of-others',
  'cohort',
  'teaching',
  'questions-write',
  'questions-publish',
  'company',
  'platform',
  'own-account',
  'proof-sheet',
  'mailbox',
] as const;
export type AccessKey = (typeof accessKeys)[number];
