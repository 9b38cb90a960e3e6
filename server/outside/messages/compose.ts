import type { Locale } from '../../../shared/vocabulary.ts';
import type { Message } from '../mail.ts';
import { en } from './en.ts';
import { es } from './es.ts';
import type { MessageCatalogue, MessageKind } from './message-texts.ts';

const catalogues: Readonly<Record<Locale, MessageCatalogue>> = { en, es };

export interface Composing {
  kind: MessageKind;
  to: string;
  language: Locale;
  name: string;
  /** Where the message's button leads. */
  url: string;
  newAddress?: string;
}

const entities: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

function escaped(text: string): string {
  return text.replace(/[&<>"']/g, (sign) => entities[sign] ?? sign);
}

/** A name a stranger typed must not carry a link or a line of its own into a message we send. */
function plainName(name: string): string {
  return name
    .replace(/[\r\n\t]+/g, ' ')
    .replace(/[/:.@<>]+/g, ' ')
    .replace(/ {2,}/g, ' ')
    .trim();
}

/** One message in the reader's language, as text and as HTML with nothing loaded from elsewhere. */
export function compose({ kind, to, language, name, url, newAddress = '' }: Composing): Message {
  const catalogue = catalogues[language];
  const said = catalogue.kinds[kind]({ name, newAddress });
  const greeting = catalogue.greeting(plainName(name));
  const link = said.action === null ? [] : [`${said.action}:\n${url}`];
  const text = [greeting, said.lead, ...link, said.after, catalogue.footer].join('\n\n');
  const button =
    said.action === null
      ? ''
      : `<p><a href="${escaped(url)}" style="display:inline-block;padding:12px 20px;background:#1d4f91;color:#ffffff;` +
        `text-decoration:none;border-radius:4px">${escaped(said.action)}</a></p>` +
        `<p>${escaped(catalogue.ifNotButton)}<br>${escaped(url)}</p>`;
  const html =
    `<!doctype html><html lang="${language}"><body style="font:16px/1.5 sans-serif;color:#1c2430">` +
    `<p>${escaped(greeting)}</p><p>${escaped(said.lead)}</p>${button}<p>${escaped(said.after)}</p>` +
    `<p style="color:#56606e">${escaped(catalogue.footer)}</p></body></html>`;
  return { to, subject: said.subject, text, html };
}
