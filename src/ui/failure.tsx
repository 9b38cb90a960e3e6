import { useStore } from '@nanostores/react';
import type { FailureCode } from '../../shared/errors.ts';
import { failureMessages } from '../i18n/failures.ts';
import { ApiError } from '../lib/api.ts';
import { Notice } from './notice.tsx';

type Known = FailureCode | 'unreachable';

/** The words for a failure, in the reader's language. */
export function useFailureText(): (error: unknown) => string {
  const t = useStore(failureMessages);
  return (error) => {
    const code = error instanceof ApiError ? error.code : 'internal';
    return code in t ? t[code as Known] : t.internal;
  };
}

/** Says what went wrong, at once. Nothing while nothing did. */
export function Failure({ error, className = 'mb-3' }: { error: unknown; className?: string }) {
  const text = useFailureText();
  if (error === null || error === undefined) return null;
  return (
    <Notice tone="error" className={className}>
      {text(error)}
    </Notice>
  );
}
