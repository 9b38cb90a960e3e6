import { mkdtemp, rm, readdir } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import nodemailer from 'nodemailer';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { listenOnLoopback, mailboxServer, smtpSink } from './servers.ts';
import { messageStore, type MessageSummary, type StoredMessage } from './store.ts';

let folder: string;
let base: string;
let smtpPort: number;
let close: () => void;

beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'mailbox-'));
  const store = messageStore(folder, 3);
  await store.open();
  const smtp = smtpSink(store);
  const http = mailboxServer(store);
  smtpPort = await listenOnLoopback(smtp, 0);
  base = `http://127.0.0.1:${await listenOnLoopback(http, 0)}`;
  close = () => {
    http.close();
    smtp.close();
  };
});
afterEach(async () => {
  close();
  await rm(folder, { recursive: true });
});

async function send(subject: string, text = 'Hello.'): Promise<void> {
  const transport = nodemailer.createTransport({ host: '127.0.0.1', port: smtpPort, secure: false });
  await transport.sendMail({
    from: 'office@example.test',
    to: 'ana@example.test',
    subject,
    text,
    html: `<p>${text}</p>`,
  });
  transport.close();
}
async function list(): Promise<MessageSummary[]> {
  return (await (await fetch(`${base}/messages`)).json()) as MessageSummary[];
}

test('keeps what was sent and shows it, newest first', async () => {
  await send('First');
  await send('Second', 'Confirm: http://localhost/confirm?token=abc');
  const messages = await list();
  expect(messages.map((message) => message.subject)).toEqual(['Second', 'First']);
  expect(messages[0]?.to).toBe('ana@example.test');
  const one = (await (await fetch(`${base}/messages/${messages[0]?.id}`)).json()) as StoredMessage;
  expect(one.text).toContain('token=abc');
  expect(one.html).toContain('<p>');
});
test('keeps the newest only, and can be emptied', async () => {
  for (const subject of ['1', '2', '3', '4']) await send(subject);
  expect((await list()).map((message) => message.subject)).toEqual(['4', '3', '2']);
  await fetch(`${base}/messages`, { method: 'DELETE' });
  expect(await readdir(folder)).toEqual([]);
});
test('refuses a message over a megabyte and keeps nothing of it', async () => {
  await expect(send('Big', 'x'.repeat(1_100_000))).rejects.toThrow(/552|size/i);
  expect(await list()).toEqual([]);
});
test('an unknown message or path is 404', async () => {
  expect((await fetch(`${base}/messages/nope`)).status).toBe(404);
  expect((await fetch(`${base}/messages/..%2f..%2fetc`)).status).toBe(404);
  expect((await fetch(`${base}/other`)).status).toBe(404);
});
