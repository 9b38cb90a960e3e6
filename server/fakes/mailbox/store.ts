import { mkdir, readdir, readFile, rm, writeFile, rename } from 'node:fs/promises';
import { join } from 'node:path';

/** A message as it was received. */
export interface StoredMessage {
  id: string;
  /** Recipients, with commas between. */
  to: string;
  from: string;
  subject: string;
  /** When it was received, ISO 8601. */
  at: string;
  text: string;
  /** Empty when the message has none. */
  html: string;
}
export type MessageSummary = Omit<StoredMessage, 'text' | 'html' | 'from'>;

const fileName = /^[0-9a-f-]{36}\.json$/;

/** Keeps the newest messages as one JSON file each; identifiers are time-ordered, so names sort by age. */
export function messageStore(folder: string, mostKept: number) {
  const names = async () =>
    (await readdir(folder))
      .filter((name) => fileName.test(name))
      .sort()
      .reverse();
  const read = async (name: string) => JSON.parse(await readFile(join(folder, name), 'utf8')) as StoredMessage;
  return {
    async open(): Promise<void> {
      await mkdir(folder, { recursive: true });
    },
    async add(message: StoredMessage): Promise<void> {
      // Written aside and moved into place, so that a reader never meets half a message.
      const path = join(folder, `${message.id}.json`);
      await writeFile(`${path}.part`, JSON.stringify(message), { mode: 0o600 });
      await rename(`${path}.part`, path);
      for (const old of (await names()).slice(mostKept)) await rm(join(folder, old), { force: true });
    },
    async list(): Promise<MessageSummary[]> {
      const messages = await Promise.all((await names()).map(read));
      return messages.map(({ id, to, subject, at }) => ({ id, to, subject, at }));
    },
    async find(id: string): Promise<StoredMessage | null> {
      const name = `${id}.json`;
      if (!fileName.test(name)) return null;
      return read(name).catch(() => null);
    },
    async clear(): Promise<void> {
      for (const name of await names()) await rm(join(folder, name), { force: true });
    },
  };
}
export type MessageStore = ReturnType<typeof messageStore>;
