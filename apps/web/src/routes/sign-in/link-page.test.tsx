import { screen } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import type * as z from 'zod/mini';
import type { SessionView, linkLook } from '#shared/contracts/accounts.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import { LinkPage } from './link-page.tsx';

const server = startApiServer();
const asCustomer: SessionView = {
  user: {
    id: 'u1',
    name: 'Tess',
    email: 'tess@example.com',
    role: 'customer',
    secondFactor: 'none',
  },
  googleSignIn: false,
};
let spent: unknown[] = [];

function look(answer: z.infer<typeof linkLook>) {
  server.use(http.post('*/api/session/links/look', () => HttpResponse.json(answer)));
}

function open(address: string) {
  return renderAt(
    address,
    <Routes>
      <Route path="/links/:purpose" element={<LinkPage />} />
      <Route path="*" element={<p>Arrived</p>} />
    </Routes>,
  );
}

beforeEach(() => {
  spent = [];
  server.use(
    http.post('*/api/session/links/use', async ({ request }) => {
      spent.push(await request.json());
      return HttpResponse.json({ purpose: 'sign-in', session: asCustomer, next: '/account' });
    }),
  );
});

describe('LinkPage', () => {
  it('spends a sign-in link by a press alone, then goes where it was meant to', async () => {
    look({ purpose: 'sign-in', email: 'tess@example.com', role: 'customer', name: null });
    const { user } = open('/links/sign-in#token-1');
    const press = await screen.findByRole('button', { name: 'Sign me in' });
    expect(spent).toEqual([]);
    await user.click(press);
    expect(await screen.findByText('Arrived')).toBeVisible();
    expect(spent).toEqual([{ token: 'token-1' }]);
  });

  it('says that a spent link is spent and how to get another', async () => {
    server.use(
      http.post('*/api/session/links/look', () =>
        HttpResponse.json(
          {
            type: 'about:blank',
            title: 'This link has been used or has run out',
            status: 410,
            code: 'link-spent',
          },
          { status: 410 },
        ),
      ),
    );
    open('/links/sign-in#token-1');
    expect(await screen.findByText('This link has been used or has run out')).toBeVisible();
    expect(screen.getByRole('link', { name: 'A link to sign in' })).toBeVisible();
    expect(screen.queryByRole('button', { name: 'Try again' })).not.toBeInTheDocument();
  });

  it('asks the first owner for an address, an invited baker not', async () => {
    look({ purpose: 'invitation', email: 'new@oxbowlane.example', role: 'baker', name: 'Wren' });
    const invited = open('/links/invitation#token-2');
    expect(await screen.findByLabelText('A password')).toBeVisible();
    expect(screen.getByLabelText('Your name')).toHaveValue('Wren');
    expect(screen.queryByLabelText('Your e-mail address')).not.toBeInTheDocument();
    invited.unmount();

    look({ purpose: 'first-owner', email: null, role: 'owner', name: null });
    open('/links/first-owner#token-3');
    expect(await screen.findByLabelText('Your e-mail address')).toBeVisible();
  });

  it('puts the server’s issue on its field and keeps what was typed', async () => {
    look({ purpose: 'password-reset', email: 'ida@oxbowlane.example', role: 'owner', name: null });
    server.use(
      http.post('*/api/session/password-resets/use', () =>
        HttpResponse.json(
          {
            type: 'about:blank',
            title: 'Some answers need another look',
            status: 422,
            code: 'invalid-input',
            issues: [{ path: ['password'], message: 'That one is known to many.' }],
          },
          { status: 422 },
        ),
      ),
    );
    const { user } = open('/links/password-reset#token-4');
    await user.type(await screen.findByLabelText('Your new password'), 'correct horse battery');
    await user.click(screen.getByRole('button', { name: 'Set the password' }));
    expect(await screen.findByRole('link', { name: 'That one is known to many.' })).toBeVisible();
    expect(screen.getByLabelText('Your new password')).toBeInvalid();
    expect(screen.getByLabelText('Your new password')).toHaveValue('correct horse battery');
  });
});
