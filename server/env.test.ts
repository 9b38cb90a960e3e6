import { describe, expect, it } from 'vitest';
import { EnvError, readEnv } from './env.ts';

const least = {
  DATABASE_URL: 'postgres://someone@127.0.0.1:5432/tankmark',
  AUTH_SECRET: 'x'.repeat(32),
  SMTP_URL: 'smtp://127.0.0.1:1025',
  MAIL_FROM: 'Tankmark <office@example.test>',
};

describe('the configuration', () => {
  it('fills in what need not be said', () => {
    expect(readEnv(least)).toEqual({
      ...least,
      NODE_ENV: 'production',
      DATABASE_POOL: 10,
      HOST: '127.0.0.1',
      PORT: 4180,
      APP_URL: 'http://127.0.0.1:4180',
      DEMO: false,
      LOG_LEVEL: 'info',
      TIME_ZONE: 'America/Chicago',
      TRUST_PROXY: 0,
    });
  });

  it('reads what is said, an empty variable as not said', () => {
    const env = readEnv({
      ...least,
      PORT: '8080',
      APP_URL: 'https://school.example/',
      DEMO: '1',
      HOST: '',
      TRUST_PROXY: '2',
    });
    expect(env).toMatchObject({
      PORT: 8080,
      APP_URL: 'https://school.example',
      DEMO: true,
      HOST: '127.0.0.1',
      TRUST_PROXY: 2,
    });
  });

  it('reports every fault at once, by name, without the values', () => {
    const read = () =>
      readEnv({ ...least, MAIL_FROM: undefined, AUTH_SECRET: 'short-one', PORT: 'x', TIME_ZONE: 'Nowhere/At all' });
    expect(read).toThrow(EnvError);
    try {
      read();
    } catch (error) {
      const { message, faults } = error as EnvError;
      expect(faults.map((fault) => fault.split(/[: ]/)[0])).toEqual(['PORT', 'AUTH_SECRET', 'MAIL_FROM', 'TIME_ZONE']);
      expect(message).toContain('MAIL_FROM is not set');
      expect(message).not.toContain('short-one');
    }
  });
});
