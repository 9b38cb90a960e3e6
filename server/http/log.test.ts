import { DrizzleQueryError } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { loggedError } from './log.ts';

describe('errors in the log', () => {
  it('keep their name, code and place, and lose addresses', () => {
    const logged = loggedError(Object.assign(new Error('550 <imre@example.test> refused'), { code: 'EENVELOPE' }));
    expect(logged).toMatchObject({ type: 'Error', code: 'EENVELOPE', message: '550 <[address]> refused' });
    expect((logged.stack as string[]).every((line) => line.startsWith('    at '))).toBe(true);
  });

  it('of the database lose their message, which repeats what was written', () => {
    const cause = Object.assign(new Error('invalid input: "secret words"'), { code: '22P02', table: 'user' });
    const logged = JSON.stringify(loggedError(new DrizzleQueryError('insert ...', ['secret words'], cause)));
    expect(logged).not.toContain('secret words');
    expect(logged).toContain('22P02');
  });

  it('that are no errors are named by their kind', () => {
    expect(loggedError('imre@example.test')).toEqual({ type: 'string' });
  });

  it('stop at the third cause', () => {
    const looped = new Error('a');
    looped.cause = looped;
    expect(JSON.stringify(loggedError(looped)).match(/"cause"/g)).toHaveLength(3);
  });
});
