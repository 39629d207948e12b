import { screen, waitFor, within } from '@testing-library/react';
import { expect, test } from 'vitest';
import { buildCase, buildCaseSummary, buildSignedIn } from '@/testing/build';
import { fakeService, Refusal } from '@/testing/fake-service';
import { renderApp } from '@/testing/renderApp';

const inside = {
  'POST /auth/refresh': buildSignedIn(),
  'GET /families': [{ id: 1, name: 'Console television, 450 mA string', kind: 'television' }],
};

test('shows the open cases with their state and a link', async () => {
  const seen = fakeService({ ...inside, 'GET /cases': [buildCaseSummary()] });
  renderApp('/');
  const table = await screen.findByRole('table', { name: 'Cases' });
  const link = within(table).getByRole('link', { name: 'Console television, green cabinet' });
  expect(link).toHaveAttribute('href', '/cases/7/intake');
  expect(within(table).getByText('On the bench')).toBeVisible();
  expect(seen.find(({ path }) => path === '/cases')?.params.state).toBe('open');
});

test('says what to do when no set is on the bench', async () => {
  fakeService({ ...inside, 'GET /cases': [] });
  renderApp('/');
  expect(await screen.findByText('No set is on the bench.')).toBeVisible();
});

test('offers another try when the cases cannot be fetched', async () => {
  let isDown = true;
  fakeService({
    ...inside,
    'GET /cases': () => (isDown ? new Refusal(500, 'internal') : [buildCaseSummary()]),
  });
  const { user } = renderApp('/');
  const alert = await screen.findByRole('alert');
  isDown = false;
  await user.click(within(alert).getByRole('button', { name: 'Try again' }));
  expect(await screen.findByRole('table', { name: 'Cases' })).toBeVisible();
});

test('searches by what is typed, and keeps the search in the address', async () => {
  const seen = fakeService({ ...inside, 'GET /cases': [] });
  const { user, router } = renderApp('/');
  await user.type(await screen.findByRole('searchbox', { name: 'Search' }), 'hum');
  await user.click(screen.getByRole('checkbox', { name: 'Only mine' }));
  await waitFor(() => expect(router.state.location.search).toBe('?search=hum&mine=1'));
  await waitFor(() =>
    expect(seen.at(-1)?.params).toEqual({ state: 'open', search: 'hum', mine: true }),
  );
  expect(await screen.findByText('No case fits what you asked for.')).toBeVisible();
});

test('opens a case from a family', async () => {
  const seen = fakeService({
    ...inside,
    'GET /cases': [],
    'POST /cases': buildCase(),
    'GET /cases/7': buildCase(),
    'GET /cases/7/readings': [],
  });
  const { user, router } = renderApp('/');
  await user.click(await screen.findByRole('button', { name: 'Open a case' }));
  const dialog = await screen.findByRole('dialog', { name: 'Open a case' });
  await user.type(within(dialog).getByLabelText(/^Set/), 'Console television');
  await user.type(within(dialog).getByLabelText(/^Complaint/), 'Dead.');
  await user.selectOptions(within(dialog).getByLabelText(/^Family/), '1');
  await user.type(within(dialog).getByLabelText('Line voltage today'), '118.4 V');
  await user.click(within(dialog).getByRole('button', { name: 'Open the case' }));
  await waitFor(() => expect(router.state.location.pathname).toBe('/cases/7/intake'));
  expect(seen.find(({ method, path }) => method === 'POST' && path === '/cases')?.body).toEqual({
    set: 'Console television',
    complaint: 'Dead.',
    lineVolts: 118.4,
    familyId: 1,
  });
});

test('says at the netlist what the service refused about it', async () => {
  fakeService({
    ...inside,
    'GET /cases': [],
    'POST /cases': new Refusal(422, 'bad-netlist', {
      errors: [{ pointer: '/parts/0/ohms', message: 'R1 needs its ohms.' }],
    }),
  });
  const { user } = renderApp('/');
  await user.click(await screen.findByRole('button', { name: 'Open a case' }));
  const dialog = await screen.findByRole('dialog', { name: 'Open a case' });
  await user.type(within(dialog).getByLabelText(/^Set/), 'Radio');
  await user.type(within(dialog).getByLabelText(/^Complaint/), 'Hums.');
  await user.click(within(dialog).getByRole('radio', { name: /JSON/ }));
  const netlist = within(dialog).getByRole('textbox', { name: 'Netlist' });
  await user.click(netlist);
  await user.paste('{ "parts": [');
  await user.click(within(dialog).getByRole('button', { name: 'Open the case' }));
  await waitFor(() => expect(netlist).toHaveAccessibleDescription(/not readable as JSON/));
  await user.clear(netlist);
  await user.click(netlist);
  await user.paste('{ "ohmstead": 1, "parts": [] }');
  await user.click(within(dialog).getByRole('button', { name: 'Open the case' }));
  await waitFor(() => expect(netlist).toHaveAccessibleDescription('R1 needs its ohms.'));
});

test('says which line of a pasted table is wrong', async () => {
  fakeService({
    ...inside,
    'GET /cases': [],
    'POST /circuits/import-csv': new Refusal(422, 'bad-csv', {
      errors: [{ pointer: '/csv', line: 2, column: 5, message: '“47x” is no value.' }],
    }),
  });
  const { user } = renderApp('/');
  await user.click(await screen.findByRole('button', { name: 'Open a case' }));
  const dialog = await screen.findByRole('dialog', { name: 'Open a case' });
  await user.type(within(dialog).getByLabelText(/^Set/), 'Radio');
  await user.type(within(dialog).getByLabelText(/^Complaint/), 'Hums.');
  await user.click(within(dialog).getByRole('radio', { name: /CSV/ }));
  await user.click(within(dialog).getByLabelText(/^Table of parts/));
  await user.paste('ref,kind,from,to,value\nR1,resistor,A,B,47x');
  await user.click(within(dialog).getByRole('button', { name: 'Open the case' }));
  await waitFor(() =>
    expect(within(dialog).getByLabelText(/^Table of parts/)).toHaveAccessibleDescription(/Line 2/),
  );
});
