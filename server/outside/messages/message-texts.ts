/** One kind of message: its subject, what it says before the link, the link's words, what it says after. */
export interface MessageText {
  subject: string;
  lead: string;
  action: string | null;
  after: string;
}

/** Who is addressed and what the message is about. */
export interface MessageFacts {
  name: string;
  /** The new address, for the messages about one. */
  newAddress: string;
}

export const messageKinds = ['confirm', 'reset', 'address-old', 'address-new', 'already-here'] as const;
export type MessageKind = (typeof messageKinds)[number];

export interface MessageCatalogue {
  greeting: (name: string) => string;
  ifNotButton: string;
  footer: string;
  kinds: Readonly<Record<MessageKind, (facts: MessageFacts) => MessageText>>;
}
