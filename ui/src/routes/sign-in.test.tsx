import { screen } from '@testing-library/react';
import { expect, test } from 'vitest';
import { buildSignedIn } from '@/testing/build';
import { fakeService, Refusal } from '@/testing/fake-service';
import { renderApp } from '@/testing/renderApp';

const nobody = {
  'POST /auth/refresh': new Refusal(401, 'not-signed-in'),
  'GET /auth/setup': { needed: false },
};

test('leads somebody who is not signed in to the door and back to where they wanted to go', async () => {
  const seen = fakeService({
    ...nobody,
    'POST /auth/sign-in': buildSignedIn(),
    'GET /rules': { rules: [], refused: [] },
  });
  const { user, router } = renderApp('/rules');
  await user.type(await screen.findByLabelText('E-mail address'), 'tove@shop.example');
  await user.type(screen.getByLabelText('Password'), 'a few good words');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
  expect(await screen.findByRole('heading', { name: 'Rules' })).toBeVisible();
  expect(router.state.location.pathname).toBe('/rules');
  expect(seen.find(({ path }) => path === '/auth/sign-in')?.body).toEqual({
    email: 'tove@shop.example',
    password: 'a few good words',
  });
});

test('says at each field what is missing and asks the service for nothing', async () => {
  const seen = fakeService(nobody);
  const { user } = renderApp('/sign-in');
  await user.click(await screen.findByRole('button', { name: 'Sign in' }));
  expect(await screen.findByLabelText('E-mail address')).toHaveAccessibleDescription(
    'Type your e-mail address.',
  );
  expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('Type your password.');
  expect(seen.some(({ path }) => path === '/auth/sign-in')).toBe(false);
});

test('says what the service says about a wrong password', async () => {
  fakeService({
    ...nobody,
    'POST /auth/sign-in': new Refusal(401, 'wrong-credentials', {
      detail: 'E-mail address and password do not belong together.',
    }),
  });
  const { user } = renderApp('/sign-in');
  await user.type(await screen.findByLabelText('E-mail address'), 'tove@shop.example');
  await user.type(screen.getByLabelText('Password'), 'wrong');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('do not belong together');
});

test('lets the first person set the shop up', async () => {
  const seen = fakeService({
    ...nobody,
    'GET /auth/setup': { needed: true },
    'POST /auth/setup': buildSignedIn({ role: 'owner' }),
    'GET /cases': [],
    'GET /families': [],
  });
  const { user } = renderApp('/sign-in');
  await user.type(await screen.findByLabelText('Name of the shop'), 'Lindqvist Radio');
  await user.type(screen.getByLabelText('Your name'), 'Tove');
  await user.type(screen.getByLabelText('E-mail address'), 'tove@shop.example');
  await user.type(screen.getByLabelText('Password'), 'short');
  await user.click(screen.getByRole('button', { name: 'Open the shop' }));
  expect(await screen.findByText(/at least 10 characters. A few/)).toBeVisible();
  await user.type(screen.getByLabelText('Password'), ' and then longer');
  await user.click(screen.getByRole('button', { name: 'Open the shop' }));
  expect(await screen.findByRole('heading', { name: 'Bench' })).toBeVisible();
  expect(seen.some(({ path }) => path === '/auth/setup')).toBe(true);
});

test('an invitation that was used already says so', async () => {
  fakeService({
    ...nobody,
    'POST /auth/accept-invitation': new Refusal(410, 'invitation-used', {
      detail: 'This invitation was used already. Sign in instead.',
    }),
  });
  const { user } = renderApp('/invitation/abc');
  await user.type(await screen.findByLabelText('Your name'), 'Kim');
  await user.type(screen.getByLabelText('Choose a password'), 'a few good words');
  await user.click(screen.getByRole('button', { name: 'Join the shop' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('was used already');
});
