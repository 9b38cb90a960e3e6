import { mkdtemp, rm } from 'node:fs/promises';
import type { Server } from 'node:http';
import { createServer, type AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { SMTPServer } from 'smtp-server';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { MailMessage, MailSummary } from '../../shared/contracts/mailbox.ts';
import { listenOnLoopback, mailboxServer, smtpSink } from '../../server/fakes/mailbox/servers.ts';
import { messageStore } from '../../server/fakes/mailbox/store.ts';
import { smtpMail, type Mail } from '../../server/outside/mail.ts';
import { startApp, type TestApp } from '../support/start-app.ts';

// The one place where mail goes the whole way: over SMTP to the local sink, and back over HTTP to the mailbox page.
let folder: string;
let smtp: SMTPServer;
let http: Server;
let mail: Mail;
let test: TestApp;
beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), 'tankmark-mailbox-'));
  const store = messageStore(folder, 20);
  await store.open();
  smtp = smtpSink(store);
  http = mailboxServer(store);
  const [smtpPort, httpPort] = [await listenOnLoopback(smtp, 0), await listenOnLoopback(http, 0)];
  mail = smtpMail({ url: `smtp://127.0.0.1:${smtpPort}`, from: 'Tankmark <office@example.test>' });
  test = await startApp({ mail, env: { DEMO: '1', MAILBOX_URL: `http://127.0.0.1:${httpPort}` } });
});
afterAll(async () => {
  await test.close();
  mail.close();
  http.close();
  await new Promise<void>((resolve) => smtp.close(() => resolve()));
  await rm(folder, { recursive: true });
});

describe('the mailbox of a demonstration', () => {
  it('shows a visitor the message that confirms an address', async () => {
    const body = { name: 'Ana Quill', email: 'ana@example.test', password: 'a long test password', language: 'es' };
    expect((await test.as().post('/api/auth/sign-up/email', body)).status).toBe(200);
    await test.background.settled();
    expect((await test.as().get('/api/session')).body).toEqual({ me: null, mailbox: true });
    const list = (await test.as().get('/api/mailbox')).body as MailSummary[];
    expect(list).toHaveLength(1);
    expect(list[0]).toMatchObject({ to: 'ana@example.test', subject: 'Confirme su dirección de correo' });
    const message = (await test.as().get(`/api/mailbox/${list[0]?.id}`)).body as MailMessage;
    expect(message.from).toBe('office@example.test');
    const token = /token=(\S+)/.exec(message.text)?.[1] ?? '';
    expect((await test.as().get(`/api/auth/verify-email?token=${token}`)).status).toBe(200);
  });

  it('is 404 for a message that is not there', async () => {
    for (const id of ['01890000-0000-7000-8000-000000000000', '..%2f..%2fmessages', 'x'.repeat(90)]) {
      expect((await test.as().get(`/api/mailbox/${id}`)).body).toMatchObject({ status: 404, code: 'not-found' });
    }
  });

  it('says so when the sink is away, and when it does not answer within three seconds', async () => {
    const silent = createServer(() => undefined);
    await new Promise<void>((resolve) => silent.listen(0, '127.0.0.1', resolve));
    const { port } = silent.address() as AddressInfo;
    for (const url of ['http://127.0.0.1:9', `http://127.0.0.1:${port}`]) {
      const other = await startApp({ env: { DEMO: '1', MAILBOX_URL: url } });
      const reply = await other.as().get('/api/mailbox');
      expect(reply.body).toMatchObject({ status: 502, code: 'mailbox-unreachable' });
      await other.close();
    }
    silent.close();
  });
});

describe('elsewhere', () => {
  it('there is no mailbox, even when an address for one is set', async () => {
    const other = await startApp({ env: { DEMO: '0', MAILBOX_URL: 'http://127.0.0.1:9' } });
    for (const path of ['/api/mailbox', '/api/mailbox/any']) {
      expect((await other.as().get(path)).body).toMatchObject({ status: 404, code: 'not-found' });
    }
    expect((await other.as().get('/api/session')).body).toMatchObject({ mailbox: false });
    await other.close();
  });
});

describe('sending', () => {
  it('tries three times, then gives up', async () => {
    let connections = 0;
    const refusing = createServer((socket) => {
      connections += 1;
      socket.end('421 not now\r\n');
    });
    await new Promise<void>((resolve) => refusing.listen(0, '127.0.0.1', resolve));
    const { port } = refusing.address() as AddressInfo;
    const sender = smtpMail({ url: `smtp://127.0.0.1:${port}`, from: 'office@example.test' });
    await expect(sender.send({ to: 'a@example.test', subject: 's', text: 't', html: '<p>t</p>' })).rejects.toThrow();
    expect(connections).toBe(3);
    sender.close();
    refusing.close();
  });
});
