import { listenOnLoopback, mailboxServer, smtpSink } from './servers.ts';
import { messageStore } from './store.ts';

// The local mail service of a demonstration or a developer: its own process, told by its arguments where to keep messages
// and where to listen. It prints one line of JSON with its ports when it is ready.

const mostKept = 500;
const [folder, smtpPort = '0', httpPort = '0'] = process.argv.slice(2);
if (folder === undefined) {
  process.stderr.write('usage: mailbox FOLDER [SMTP-PORT] [HTTP-PORT]\n');
  process.exit(2);
}
const store = messageStore(folder, mostKept);
await store.open();
const smtp = smtpSink(store);
smtp.on('error', () => undefined);
const http = mailboxServer(store);
const ports = {
  smtp: await listenOnLoopback(smtp, Number(smtpPort)),
  http: await listenOnLoopback(http, Number(httpPort)),
};
process.stdout.write(`${JSON.stringify(ports)}\n`);

function stop(): void {
  http.close();
  http.closeAllConnections();
  smtp.close(() => process.exit(0));
}
process.on('SIGTERM', stop);
process.on('SIGINT', stop);
process.on('disconnect', stop);
