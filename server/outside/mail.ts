import { setTimeout as pause } from 'node:timers/promises';
import nodemailer from 'nodemailer';

export interface Message {
  to: string;
  subject: string;
  text: string;
  html: string;
}

/** Sends one message; rejects when it could not be handed over. */
export interface Mail {
  send: (message: Message) => Promise<void>;
  close: () => void;
}

const tries = 3;
const firstPauseMs = 400;
const timeoutMs = 5_000;

/** Mail over SMTP. A message is tried three times, with a longer pause each time. */
export function smtpMail(options: { url: string; from: string }): Mail {
  const { hostname, port, protocol, username, password } = new URL(options.url);
  const secure = protocol === 'smtps:';
  const transport = nodemailer.createTransport({
    host: hostname,
    port: port === '' ? (secure ? 465 : 587) : Number(port),
    secure,
    ...(username === '' ? {} : { auth: { user: decodeURIComponent(username), pass: decodeURIComponent(password) } }),
    connectionTimeout: timeoutMs,
    greetingTimeout: timeoutMs,
    socketTimeout: 2 * timeoutMs,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return {
    async send(message) {
      for (let attempt = 1; ; attempt += 1) {
        try {
          await transport.sendMail({ from: options.from, ...message });
          return;
        } catch (error) {
          if (attempt === tries) throw error;
          await pause(firstPauseMs * 2 ** (attempt - 1));
        }
      }
    },
    close: () => transport.close(),
  };
}
