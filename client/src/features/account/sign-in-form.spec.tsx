import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen, waitFor } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { WithProviders } from '../../ui/test/with-providers';
import { SignInForm } from './sign-in-page';

const answer = (status: number, body: object, headers: Record<string, string> = {}) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json', ...headers } });

function show(response: () => Response) {
  const fetched = vi.spyOn(globalThis, 'fetch').mockImplementation(() => Promise.resolve(response()));
  render(
    <QueryClientProvider client={new QueryClient()}>
      <WithProviders>
        <SignInForm next={null} />
      </WithProviders>
    </QueryClientProvider>,
  );
  return { user: userEvent.setup(), fetched };
}

async function fill(user: ReturnType<typeof userEvent.setup>, email: string, password: string) {
  if (email !== '') await user.type(screen.getByLabelText('E-mail'), email);
  if (password !== '') await user.type(screen.getByLabelText('Password'), password);
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
}

describe('the sign-in form', () => {
  it('names what is missing at its field and sends nothing', async () => {
    const { user, fetched } = show(() => answer(200, {}));
    await fill(user, 'no address', '');
    expect(await screen.findByText('Enter an e-mail address.')).toBeVisible();
    expect(screen.getByText('Enter the password.')).toBeVisible();
    expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(/Enter an e-mail address\./);
    expect(fetched).not.toHaveBeenCalled();
  });

  it('keeps what was typed when the pair is refused', async () => {
    const { user } = show(() => answer(401, { title: 'UNAUTHENTICATED' }));
    await fill(user, 'editor@demo.example', 'wrong');
    expect(await screen.findByText(/do not belong together/)).toBeVisible();
    expect(screen.getByLabelText('E-mail')).toHaveValue('editor@demo.example');
    expect(screen.getByLabelText('Password')).toHaveValue('wrong');
  });

  it('says how long to wait after too many failures', async () => {
    const { user } = show(() => answer(429, { title: 'RATE_LIMITED' }, { 'Retry-After': '40' }));
    await fill(user, 'editor@demo.example', 'wrong');
    expect(await screen.findByText(/Try again in 40 s\./)).toBeVisible();
  });

  it('shows and hides the password', async () => {
    const { user } = show(() => answer(200, {}));
    await user.click(screen.getByRole('button', { name: 'show the password' }));
    expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'text');
    await user.click(screen.getByRole('button', { name: 'hide the password' }));
    expect(screen.getByLabelText('Password')).toHaveAttribute('type', 'password');
  });

  it('sends the pair as JSON', async () => {
    const { user, fetched } = show(() =>
      answer(200, {
        accessToken: 'token',
        expiresIn: 600,
        person: { id: '1', name: 'Demo editor', roles: ['EDITOR'] },
      }),
    );
    await fill(user, 'editor@demo.example', 'diffolio-demo');
    await waitFor(() => expect(fetched).toHaveBeenCalledOnce());
    const [path, init] = fetched.mock.calls[0] ?? [];
    expect(path).toBe('/api/auth/sign-in');
    expect(init?.body).toBe('{"email":"editor@demo.example","password":"diffolio-demo"}');
  });
});
