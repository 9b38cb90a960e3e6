import type { ProblemJson } from '../../shared/contracts/problem-json.ts';
import type { AppError, FailureCode } from '../../shared/errors.ts';

interface Mapping {
  status: number;
  title: string;
  detail: string;
}

/** Every failure code and what HTTP says of it. A code without a line here does not compile. */
export const problemByCode: Readonly<Record<FailureCode, Mapping>> = {
  'bad-request': { status: 400, title: 'Bad request', detail: 'The request could not be understood.' },
  'bad-json': { status: 400, title: 'Not valid JSON', detail: 'The body is not valid JSON.' },
  'bad-body': { status: 422, title: 'Some fields need a change', detail: 'One or more fields were not as expected.' },
  'bad-query': { status: 400, title: 'Bad query', detail: 'One or more query parameters were not as expected.' },
  'body-too-large': { status: 413, title: 'Too large', detail: 'The body is larger than this address takes.' },
  'media-type': { status: 415, title: 'Not JSON', detail: 'This address takes application/json.' },
  'not-signed-in': { status: 401, title: 'Not signed in', detail: 'Sign in first.' },
  'foreign-origin': { status: 403, title: 'From elsewhere', detail: 'The request did not come from this site.' },
  'role-missing': { status: 403, title: 'Not allowed', detail: 'Your account does not have the role this needs.' },
  'seat-missing': { status: 403, title: 'A seat is needed', detail: 'This part opens with a seat.' },
  'account-locked': { status: 403, title: 'Account locked', detail: 'This account is locked. Ask the office.' },
  'address-unconfirmed': { status: 403, title: 'Address not confirmed', detail: 'Confirm your e-mail address first.' },
  'sign-in-wrong': { status: 401, title: 'Could not sign in', detail: 'The address or the password is not right.' },
  'password-wrong': { status: 422, title: 'Wrong password', detail: 'The password is not right.' },
  'token-invalid': { status: 400, title: 'Link no longer valid', detail: 'The link was used already, or is too old.' },
  'not-found': { status: 404, title: 'Not found', detail: 'There is nothing at this address.' },
  'too-many-requests': { status: 429, title: 'Too many tries', detail: 'Wait a little, then try again.' },
  'lesson-unfinished': {
    status: 409,
    title: 'Not finished yet',
    detail: 'Answer the checkpoints of the lesson first.',
  },
  'key-reused': { status: 409, title: 'Key used before', detail: 'This key was used for another answer.' },
  'part-closed': { status: 409, title: 'Part closed', detail: 'This part is closed. Its answer is shown.' },
  'out-of-turn': {
    status: 409,
    title: 'Out of turn',
    detail: 'Parts are answered and hints are shown one after the other.',
  },
  'drill-done': { status: 409, title: 'Drill done', detail: 'This drill has no more problems.' },
  'nothing-to-drill': { status: 422, title: 'Nothing to drill', detail: 'There are no problems for this choice yet.' },
  busy: { status: 503, title: 'Busy', detail: 'Too much at once. Try again.' },
  'mailbox-unreachable': { status: 502, title: 'Mailbox unreachable', detail: 'The mailbox service does not answer.' },
  'mail-failed': { status: 503, title: 'Mail could not be sent', detail: 'Mail could not be sent. Try again later.' },
  internal: { status: 500, title: 'Something went wrong', detail: 'Something went wrong on our side.' },
};

/** The reply's body for a failure: nothing in it but the code, its fixed texts and the fields at fault. */
export function problemJson(error: Pick<AppError, 'code' | 'errors'>, requestId?: string): ProblemJson {
  const { status, title, detail } = problemByCode[error.code];
  return {
    type: `urn:tankmark:problem:${error.code}`,
    title,
    status,
    code: error.code,
    detail,
    ...(requestId === undefined ? {} : { instance: `urn:uuid:${requestId}` }),
    ...(error.errors.length === 0 ? {} : { errors: [...error.errors] }),
  };
}
