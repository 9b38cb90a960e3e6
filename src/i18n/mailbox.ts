import { params } from '@nanostores/i18n';
import { i18n } from './i18n.ts';

export const mailboxMessages = i18n('mailbox', {
  title: 'Mailbox',
  intro: 'Every message this demonstration has sent, to anyone. There is no such page in real use.',
  empty: 'Nothing was sent yet. Create an account, and its message shows up here.',
  list: 'Messages, newest first',
  to: params('To {to}'),
  from: params('From {from}'),
  choose: 'Choose a message to read it.',
  back: 'All messages',
});
