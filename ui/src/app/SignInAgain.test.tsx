import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { buildCase, buildSignedIn } from '@/testing/build';
import { fakeService, Refusal } from '@/testing/fake-service';
import { renderApp } from '@/testing/renderApp';

/** A case whose session ends after the first page; the service counts what it is asked. */
function endingSession(whoComesBack = buildSignedIn({ id: 2 })) {
  let isOver = false;
  const seen = fakeService({
    'POST /auth/refresh': () =>
      isOver ? new Refusal(401, 'signed-out') : buildSignedIn({ id: 2 }),
    'POST /auth/sign-in': () => {
      isOver = false;
      return whoComesBack;
    },
    'POST /auth/sign-out': undefined,
    'GET /auth/setup': { needed: false },
    'GET /cases': [],
    'GET /families': [],
    'GET /cases/7': buildCase(),
    'GET /cases/7/readings': [],
    'PATCH /cases/7': () =>
      isOver
        ? new Refusal(401, 'signed-out')
        : buildCase({ complaint: 'Dead. No tube lights. Smells of tar.', version: 4 }),
  });
  const end = () => {
    isOver = true;
  };
  const saves = () => seen.filter(({ method }) => method === 'PATCH').length;
  return { end, saves };
}

type User = ReturnType<typeof renderApp>['user'];

/** Puts text at the end of a field at once; typing it key by key takes the slow page long. */
async function put(user: User, field: HTMLElement, text: string) {
  await user.click(field);
  await user.paste(text);
}

async function typeAndSave(user: User) {
  await put(user, await screen.findByLabelText(/^Complaint/), ' Smells of tar.');
  await user.click(screen.getByText('Save'));
  return screen.findByRole('alertdialog', { name: 'Please sign in again' }, { timeout: 8_000 });
}

test('what was typed is saved once the same person has signed in again', async () => {
  const { end, saves } = endingSession();
  const { user } = renderApp('/cases/7/intake');
  await screen.findByLabelText(/^Complaint/);
  end();
  const dialog = await typeAndSave(user);
  expect(saves()).toBe(1);
  await put(user, within(dialog).getByLabelText('Password'), 'a warm filament');
  await user.click(within(dialog).getByRole('button', { name: 'Sign in' }));
  await waitFor(() => expect(saves()).toBe(2));
  await waitFor(() => expect(dialog).not.toBeInTheDocument());
  expect(screen.getByLabelText(/^Complaint/)).toHaveValue('Dead. No tube lights. Smells of tar.');
});

test('nothing is sent in the name of somebody else', async () => {
  const { end, saves } = endingSession(buildSignedIn({ id: 5, name: 'Kim' }));
  const { user, router } = renderApp('/cases/7/intake');
  await screen.findByLabelText(/^Complaint/);
  end();
  const dialog = await typeAndSave(user);
  await put(user, within(dialog).getByLabelText('Password'), 'a warm filament');
  await user.click(within(dialog).getByRole('button', { name: 'Sign in' }));
  await waitFor(() => expect(router.state.location.pathname).toBe('/'));
  expect(saves()).toBe(1);
});

test('leaving leads to the door, and from there back', async () => {
  const { end } = endingSession();
  const { user, router } = renderApp('/cases/7/intake');
  await screen.findByLabelText(/^Complaint/);
  end();
  const dialog = await typeAndSave(user);
  await user.click(within(dialog).getByRole('button', { name: 'Leave this page' }));
  await waitFor(() => expect(router.state.location.pathname).toBe('/sign-in'));
  expect(router.state.location.search).toBe('?to=%2Fcases%2F7%2Fintake');
});

test('a case that is on the page stays there when it cannot be fetched anew', async () => {
  let isDown = false;
  fakeService({
    'POST /auth/refresh': buildSignedIn(),
    'GET /cases/7': () => (isDown ? new Refusal(500, 'internal') : buildCase()),
    'GET /cases/7/readings': [],
  });
  const { user, queryClient } = renderApp('/cases/7/intake');
  await put(user, await screen.findByLabelText(/^Complaint/), ' Hums.');
  isDown = true;
  await queryClient.refetchQueries();
  expect(screen.getByLabelText(/^Complaint/)).toHaveValue('Dead. No tube lights. Hums.');
});
