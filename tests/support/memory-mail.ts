import type { Mail, Message } from '../../server/outside/mail.ts';

export interface MemoryMail extends Mail {
  readonly messages: Message[];
  /** The newest message to that address. */
  latestTo: (email: string) => Message;
}

/** Mail that keeps what it is given, for tests. */
export function memoryMail(): MemoryMail {
  const messages: Message[] = [];
  return {
    messages,
    send(message) {
      messages.push(message);
      return Promise.resolve();
    },
    close: () => undefined,
    latestTo(email) {
      const found = messages.findLast((message) => message.to === email);
      if (!found) throw new Error(`No message to ${email}; there are ${messages.length} to others.`);
      return found;
    },
  };
}

/** The link in a message's text. */
export function linkIn(message: Message): URL {
  const found = /https?:\/\/\S+/.exec(message.text);
  if (!found) throw new Error(`There is no link in "${message.subject}".`);
  return new URL(found[0]);
}
