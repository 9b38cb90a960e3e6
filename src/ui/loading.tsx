import { useStore } from '@nanostores/react';
import { shellMessages } from '../i18n/shell.ts';

export function Loading() {
  const { loading } = useStore(shellMessages);
  return <output className="block py-8 text-ink-soft">{loading} …</output>;
}
