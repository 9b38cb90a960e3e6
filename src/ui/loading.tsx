import { useStore } from '@nanostores/react';
import { shellMessages } from '../i18n/shell.ts';

export function Loading() {
  const { loading } = useStore(shellMessages);
  return (
    <p role="status" className="py-8 text-ink-soft">
      {loading} …
    </p>
  );
}
