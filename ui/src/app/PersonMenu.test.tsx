import { screen, waitFor } from '@testing-library/react';
import { beforeEach, expect, test } from 'vitest';
import { buildSignedIn } from '@/testing/build';
import { fakeService } from '@/testing/fake-service';
import { renderApp } from '@/testing/renderApp';

const answers = {
  'POST /auth/refresh': buildSignedIn({ id: 2, name: 'Tove Lindqvist' }),
  'POST /auth/sign-out': undefined,
  'GET /auth/setup': { needed: false },
  'GET /cases': [],
  'GET /families': [],
};

beforeEach(() => localStorage.clear());

const scheme = () => document.documentElement.style.colorScheme;

test('the page follows the device until somebody chooses, and keeps each person’s choice', async () => {
  fakeService(answers);
  const { user } = renderApp('/');
  const look = await screen.findByLabelText('Look of the page');
  expect(scheme()).toBe('light');
  await user.selectOptions(look, 'Dim bench');
  await waitFor(() => expect(scheme()).toBe('dark'));
  const kept = JSON.parse(localStorage.getItem('ohmstead-theme') ?? '{}') as object;
  expect(kept).toMatchObject({ state: { choices: { 2: 'dark' } } });
});

test('signing out leads to the door', async () => {
  fakeService(answers);
  const { user, router } = renderApp('/');
  await user.click(await screen.findByText('Sign out'));
  await waitFor(() => expect(router.state.location.pathname).toBe('/sign-in'));
});
