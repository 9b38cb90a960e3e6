import type { MessageCatalogue } from './message-texts.ts';

export const en: MessageCatalogue = {
  greeting: (name) => `Hello ${name},`,
  ifNotButton: 'If the button does not work, copy this address into your browser:',
  footer: 'Tankmark, training for the pesticide applicator examination.',
  kinds: {
    confirm: () => ({
      subject: 'Confirm your e-mail address',
      lead: 'Someone, most likely you, made a Tankmark account with this address. Confirm the address to use the account.',
      action: 'Confirm my address',
      after: 'The link works for 24 hours. If it was not you, do nothing: the account stays closed.',
    }),
    reset: () => ({
      subject: 'Choose a new password',
      lead: 'You asked for a new password for your Tankmark account.',
      action: 'Choose a new password',
      after: 'The link works once, for one hour. If you did not ask for it, do nothing: your password stays as it is.',
    }),
    'address-old': ({ newAddress }) => ({
      subject: 'Change of your e-mail address',
      lead: `You asked to change the address of your Tankmark account to ${newAddress}. Allow it here; then we write to the new address.`,
      action: 'Allow the change',
      after: 'The link works for 24 hours. If you did not ask for this, do nothing, and change your password.',
    }),
    'address-new': () => ({
      subject: 'Confirm your new e-mail address',
      lead: 'This address was given as the new one of a Tankmark account. Confirm it to finish the change.',
      action: 'Confirm my new address',
      after: 'The link works for 24 hours. If it was not you, do nothing: nothing changes.',
    }),
    'already-here': () => ({
      subject: 'You already have an account',
      lead: 'Someone, perhaps you, tried to make a Tankmark account with this address. There is one already, so nothing was changed. Sign in, or choose a new password if you forgot yours.',
      action: 'Go to sign-in',
      after: 'If it was not you, you need not do anything.',
    }),
  },
};
