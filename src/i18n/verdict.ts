import { params } from '@nanostores/i18n';
import { i18n } from './i18n.ts';

export const verdictMessages = i18n('verdict', {
  right: 'Right',
  carried: 'Earns its mark',
  slip: 'A slip',
  notYet: 'Not yet',
  blank: 'Left open',
  readAs: params('Read as {read}.'),
});
