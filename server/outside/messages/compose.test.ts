import { describe, expect, it } from 'vitest';
import { locales } from '../../../shared/vocabulary.ts';
import { compose } from './compose.ts';
import { messageKinds } from './message-texts.ts';

describe('messages', () => {
  const facts = {
    to: 'imre@example.test',
    name: 'Imre',
    url: 'http://tankmark.test/x?a=1&b=2',
    newAddress: 'new@example.test',
  };

  it.each(locales.flatMap((language) => messageKinds.map((kind) => [language, kind] as const)))(
    'in %s: %s says who, what and where',
    (language, kind) => {
      const message = compose({ ...facts, language, kind });
      expect(message.to).toBe(facts.to);
      expect(message.subject.length).toBeGreaterThan(10);
      expect(message.text).toContain('Imre');
      expect(message.text).toContain(facts.url);
      expect(message.html).toContain('href="http://tankmark.test/x?a=1&amp;b=2"');
      expect(message.html).toContain(`lang="${language}"`);
      expect(message.text + message.subject).not.toMatch(/!|undefined/);
    },
  );

  it('speaks each language', () => {
    for (const kind of messageKinds) {
      expect(compose({ ...facts, language: 'es', kind }).subject).not.toBe(
        compose({ ...facts, language: 'en', kind }).subject,
      );
    }
  });

  it('lets no name carry markup, a line of its own or a link', () => {
    const name = 'Eve <script>\nBcc: x@y.z\nhttps://evil.example/go';
    const { text, html } = compose({ ...facts, name, language: 'en', kind: 'confirm' });
    expect(html).not.toContain('<script');
    expect(text.split('\n')[0]).toBe('Hello Eve script Bcc x y z https evil example go,');
  });
});
