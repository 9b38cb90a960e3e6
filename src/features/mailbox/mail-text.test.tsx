import { render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router';
import { expect, test } from 'vitest';
import { MailText } from './mail-text.tsx';

test('addresses of this site can be followed, others stay text', () => {
  const text = `Confirm: ${window.location.origin}/confirm?kind=confirm&token=abc\nNot ours: https://other.test/confirm?token=abc ${window.location.origin}//third.test/confirm`;
  render(
    <MemoryRouter>
      <MailText text={text} />
    </MemoryRouter>,
  );
  expect(screen.getAllByRole('link').map((link) => link.getAttribute('href'))).toEqual([
    '/confirm?kind=confirm&token=abc',
  ]);
  expect(screen.getByText(/other\.test/)).toBeVisible();
});
