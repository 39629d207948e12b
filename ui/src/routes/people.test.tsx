import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { buildPerson, buildSignedIn } from '@/testing/build';
import { fakeService, Refusal } from '@/testing/fake-service';
import { renderApp } from '@/testing/renderApp';

const owner = buildPerson({ id: 1, name: 'Olga Marsh', role: 'owner' });

test('a technician is told that people belong to the owner, and no request is made', async () => {
  const seen = fakeService({ 'POST /auth/refresh': buildSignedIn() });
  renderApp('/people');
  expect(await screen.findByText('Only the owner of the shop sees its people.')).toBeVisible();
  expect(screen.queryByRole('link', { name: 'People' })).not.toBeInTheDocument();
  expect(seen.some(({ path }) => path === '/people')).toBe(false);
});

test('an owner invites somebody and gets a link to hand over', async () => {
  const invited = buildPerson({ id: 9, name: 'Kim', isInvited: true, role: 'trainee' });
  const seen = fakeService({
    'POST /auth/refresh': buildSignedIn(owner),
    'GET /people': [owner],
    'POST /people/invitations': { person: invited, invitationLink: '/invitation/abc' },
  });
  const { user } = renderApp('/people');
  await user.click(await screen.findByRole('button', { name: 'Invite a person' }));
  const dialog = await screen.findByRole('dialog', { name: 'Invite a person' });
  await user.type(within(dialog).getByLabelText(/^Name/), 'Kim');
  await user.type(within(dialog).getByLabelText(/^E-mail/), 'kim@shop.example');
  await user.selectOptions(within(dialog).getByLabelText('Role'), 'trainee');
  await user.click(within(dialog).getByRole('button', { name: 'Make the invitation' }));
  expect(await within(dialog).findByLabelText('Invitation link')).toHaveValue(
    `${window.location.origin}/invitation/abc`,
  );
  expect(seen.find(({ path }) => path === '/people/invitations')?.body).toEqual({
    name: 'Kim',
    email: 'kim@shop.example',
    role: 'trainee',
  });
});

test('says why the last owner keeps the role', async () => {
  fakeService({
    'POST /auth/refresh': buildSignedIn(owner),
    'GET /people': [owner, buildPerson()],
    'PATCH /people/1': new Refusal(409, 'last-owner', {
      detail: 'A shop needs an owner. Make somebody else owner first.',
    }),
  });
  const { user } = renderApp('/people');
  await user.selectOptions(await screen.findByLabelText('Role of Olga Marsh'), 'trainee');
  expect(await screen.findByRole('alert')).toHaveTextContent('A shop needs an owner.');
});

test('blocks somebody', async () => {
  const seen = fakeService({
    'POST /auth/refresh': buildSignedIn(owner),
    'GET /people': [owner, buildPerson()],
    'PATCH /people/2': buildPerson({ isBlocked: true }),
  });
  const { user } = renderApp('/people');
  await user.click(await screen.findByRole('button', { name: 'Block Tove Lindqvist' }));
  await waitFor(() =>
    expect(seen.find(({ method }) => method === 'PATCH')?.body).toEqual({ isBlocked: true }),
  );
});
