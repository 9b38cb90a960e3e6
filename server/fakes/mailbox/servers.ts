import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { simpleParser, type AddressObject } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { v7 as uuidv7 } from 'uuid';
import type { MessageStore } from './store.ts';

const mostBytes = 1_000_000;

function addresses(field: AddressObject | AddressObject[] | undefined): string[] {
  const list = field === undefined ? [] : Array.isArray(field) ? field : [field];
  return list.flatMap((one) => one.value.map((entry) => entry.address ?? ''));
}

/** Takes any mail on loopback and keeps it; nothing is ever sent on. */
export function smtpSink(store: MessageStore): SMTPServer {
  return new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: mostBytes,
    logger: false,
    onData(stream, session, done) {
      simpleParser(stream)
        .then(async (mail) => {
          if (stream.sizeExceeded) throw Object.assign(new Error('The message is too large.'), { responseCode: 552 });
          const to = session.envelope.rcptTo.map((recipient) => recipient.address).join(', ');
          await store.add({
            id: uuidv7(),
            to,
            from: addresses(mail.from)[0] ?? '',
            subject: mail.subject ?? '',
            at: new Date().toISOString(),
            text: mail.text ?? '',
            html: typeof mail.html === 'string' ? mail.html : '',
          });
          done();
        })
        .catch((error: unknown) => done(error as Error));
    },
  });
}

/** Lets the mailbox page read what was sent: GET /messages, GET /messages/:id, DELETE /messages. */
export function mailboxServer(store: MessageStore): Server {
  return createServer((request, response) => {
    const reply = (status: number, body: unknown) => {
      response.writeHead(status, { 'content-type': 'application/json' }).end(JSON.stringify(body));
    };
    const path = new URL(request.url ?? '/', 'http://mailbox').pathname;
    const one = /^\/messages\/([^/]+)$/.exec(path)?.[1];
    const answer = async () => {
      if (request.method === 'GET' && path === '/messages') reply(200, await store.list());
      else if (request.method === 'DELETE' && path === '/messages') reply(200, await store.clear());
      else if (request.method === 'GET' && one !== undefined) {
        const message = await store.find(one);
        reply(message ? 200 : 404, message ?? { error: 'no such message' });
      } else reply(404, { error: 'nothing here' });
    };
    answer().catch(() => reply(500, { error: 'the mailbox failed' }));
  });
}

/** Listens on loopback; resolves with the port taken. */
export function listenOnLoopback(server: Server | SMTPServer, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    const listener = server instanceof SMTPServer ? server.server : server;
    listener.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve((listener.address() as AddressInfo).port));
  });
}
