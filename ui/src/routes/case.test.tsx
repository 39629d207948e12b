import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { type Case } from '@/lib/api-model';
import { buildCase, buildSignedIn } from '@/testing/build';
import { fakeService, Refusal } from '@/testing/fake-service';
import { renderApp } from '@/testing/renderApp';

function serve(repair: Case, more: Record<string, unknown> = {}) {
  return fakeService({
    'POST /auth/refresh': buildSignedIn(),
    [`GET /cases/${repair.id}`]: repair,
    [`GET /cases/${repair.id}/readings`]: [],
    'GET /meters': [],
    ...more,
  });
}

test('reading the cautions is recorded and opens the powered readings', async () => {
  const seen = serve(buildCase(), {
    'POST /cases/7/cautions': buildCase({ cautionAcknowledged: true }),
  });
  const { user } = renderApp('/cases/7/readings');
  // Cold readings are there before anything was acknowledged.
  expect((await screen.findAllByRole('textbox')).length).toBeGreaterThan(0);
  await user.click(await screen.findByRole('button', { name: 'Read the cautions' }));
  const dialog = await screen.findByRole('dialog', { name: 'Before power' });
  expect(within(dialog).getByText('The chassis may be live.')).toBeVisible();
  expect(within(dialog).getByText(/isolation transformer before/)).toBeVisible();
  expect(within(dialog).getByText(/Local codes come first/)).toBeVisible();
  await user.click(within(dialog).getByRole('button', { name: 'I have read them' }));
  await waitFor(() => expect(screen.queryByRole('dialog')).not.toBeInTheDocument());
  expect(seen.some(({ path }) => path === '/cases/7/cautions')).toBe(true);
  expect(screen.queryByRole('button', { name: 'Read the cautions' })).not.toBeInTheDocument();
});

test('a trainee reads why the case cannot be closed', async () => {
  serve(buildCase({ abilities: { edit: true, record: true, close: false, reopen: false } }));
  renderApp('/cases/7/intake');
  expect(await screen.findByText(/A trainee cannot close a case/)).toBeVisible();
  expect(screen.queryByRole('button', { name: /Close the case/ })).not.toBeInTheDocument();
});

test('closing as repaired asks for a confirmed fault first', async () => {
  const seen = serve(buildCase(), { 'POST /cases/7/close': buildCase({ state: 'closed' }) });
  const { user } = renderApp('/cases/7/intake');
  await user.click(await screen.findByRole('button', { name: /Close the case/ }));
  const dialog = await screen.findByRole('dialog', { name: 'Close the case' });
  await user.click(within(dialog).getByRole('button', { name: 'Close the case' }));
  expect(await within(dialog).findByRole('alert')).toHaveTextContent('Add the fault');
  await user.selectOptions(within(dialog).getByLabelText('Part'), 'R1');
  await user.click(within(dialog).getByRole('button', { name: 'Add the fault' }));
  await user.click(within(dialog).getByRole('button', { name: 'Close the case' }));
  await waitFor(() =>
    expect(seen.find(({ path }) => path === '/cases/7/close')?.body).toEqual({
      outcome: 'repaired',
      confirmedFaults: [{ part: 'R1', mode: 'open' }],
      note: '',
    }),
  );
});

test('a difference is said in words and sent as found', async () => {
  const seen = serve(buildCase({ asFound: [{ part: 'R2', change: 'bridged' }] }), {
    'PATCH /cases/7': buildCase(),
  });
  const { user } = renderApp('/cases/7/intake');
  expect(await screen.findByText('R2 is bridged with a wire.')).toBeVisible();
  await user.click(screen.getByRole('button', { name: 'Add a difference' }));
  const form = screen.getByRole('form', { name: 'Add a difference' });
  await user.selectOptions(within(form).getByLabelText('What differs'), 'value');
  await user.selectOptions(within(form).getByLabelText(/^Part/), 'R1');
  await user.click(within(form).getByRole('button', { name: 'Add the difference' }));
  expect(within(form).getByLabelText('Resistance')).toHaveAccessibleDescription(/what is there/);
  await user.type(within(form).getByLabelText('Resistance'), '4.7k');
  await user.click(within(form).getByRole('button', { name: 'Add the difference' }));
  await waitFor(() =>
    expect(seen.find(({ method }) => method === 'PATCH')?.body).toEqual({
      asFound: [
        { part: 'R2', change: 'bridged' },
        { part: 'R1', change: 'value', ohms: 4700 },
      ],
      version: 3,
    }),
  );
});

test('a case that is not there says so and offers another try', async () => {
  fakeService({
    'POST /auth/refresh': buildSignedIn(),
    'GET /cases/8': new Refusal(404, 'not-found', { detail: 'There is no such case.' }),
  });
  renderApp('/cases/8/intake');
  const alert = await screen.findByText('There is no such case.');
  expect(alert).toBeVisible();
  expect(screen.getByRole('button', { name: 'Try again' })).toBeVisible();
});

test('an address that leads nowhere offers the way back', async () => {
  fakeService({ 'POST /auth/refresh': buildSignedIn() });
  renderApp('/nowhere');
  expect(await screen.findByText('This address leads nowhere.')).toBeVisible();
  expect(screen.getByRole('link', { name: 'Go to the bench' })).toHaveAttribute('href', '/');
});
