import { type Netlist } from '@engine/netlist/types';
import { screen, waitFor as waitForThat } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { apiClient } from '@/lib/api-client';
import { consoleString } from '@/testing/fixtures/circuits';
import { buildDiagnosisResult, consoleReadings } from '@/testing/fixtures/diagnosis';
import { renderPanel } from '@/testing/fixtures/renderPanel';
import { type NewReading } from '../api/save-readings';
import { usePendingReadings } from '../entry/pending-readings';
import { ReadingsPanel, type ReadingsPanelProps } from './ReadingsPanel';

vi.mock('@/lib/api-client', () => ({
  apiClient: { get: vi.fn(), post: vi.fn(), delete: vi.fn() },
}));
/** A loaded machine takes its time. */
const waitFor = (check: () => void) => waitForThat(check, { timeout: 8_000 });

const client = vi.mocked(apiClient);
let nextId = 100;

// The upper half is enough, and renders in half the time.
const circuit: Netlist = {
  ...consoleString,
  parts: consoleString.parts.slice(0, 10),
  points: consoleString.points?.slice(0, 5),
};

function panel(props: Partial<ReadingsPanelProps> = {}) {
  return (
    <ReadingsPanel
      caseId="c1"
      netlist={circuit}
      nextReadings={buildDiagnosisResult().nextReadings}
      isCautionAcknowledged
      onNeedCautions={vi.fn()}
      {...props}
    />
  );
}

const cell = (name: string) => screen.findByLabelText(name);

function sent(): NewReading[] {
  return client.post.mock.calls.flatMap(
    ([, body]) => (body as { readings: NewReading[] }).readings,
  );
}

beforeEach(() => {
  localStorage.clear();
  usePendingReadings.setState({ pending: {}, drafts: {} });
  vi.resetAllMocks();
  Element.prototype.scrollIntoView = vi.fn();
  client.get.mockImplementation(async (url) => ({
    data: String(url).includes('meters') ? [] : consoleReadings,
  }));
  client.post.mockImplementation(async (_url, body) => ({
    data: (body as { readings: NewReading[] }).readings.map((reading) => ({
      ...reading,
      id: nextId++,
    })),
  }));
  client.delete.mockResolvedValue({ data: undefined });
});

describe('ReadingsPanel', () => {
  it('shows what was read', async () => {
    renderPanel(panel());
    expect(await cell('AC volts at Dropper lug 2')).toHaveValue('117.1 V');
    expect(await cell('ohms at Dropper lug 1')).toHaveValue('OL');
    expect(await cell('how DS1 looks, powered')).toHaveDisplayValue('Dark');
    expect(await cell('how DS1 looks, power off')).toHaveDisplayValue('–');
  });

  it('saves on Enter, once, and goes to the next place', async () => {
    renderPanel(panel());
    await userEvent.type(await cell('ohms across R1A'), '22.3{Enter}');
    expect(await cell('ohms across R1B')).toHaveFocus();
    await waitFor(() => expect(screen.getByText('All readings are saved.')).toBeInTheDocument());
    expect(sent()).toEqual([
      expect.objectContaining({
        take: 'ohms',
        part: 'R1A',
        value: 22.3,
        clientId: expect.any(String),
      }),
    ]);
    expect(await cell('ohms across R1A')).toHaveValue('22.3 Ω');
  });

  it('moves with arrows and reverts with Escape', async () => {
    renderPanel(panel());
    const field = await cell('ohms at Dropper lug 1');
    await userEvent.click(field);
    await userEvent.keyboard('55{Escape}');
    expect(field).toHaveValue('OL');
    await userEvent.keyboard('{ArrowDown}');
    expect(await cell('ohms at Dropper lug 2')).toHaveFocus();
    await userEvent.keyboard('{ArrowUp}{ArrowUp}');
    expect(await cell('ohms at Switch')).toHaveFocus();
    expect(sent()).toEqual([]);
  });

  it('says what is wrong at the field and keeps what was typed', async () => {
    renderPanel(panel());
    const field = await cell('ohms across R1A');
    await userEvent.type(field, '12 V{Enter}');
    expect(field).toHaveFocus();
    expect(field).toHaveValue('12 V');
    expect(field).toHaveAccessibleDescription(/wants ohms/);
    expect(sent()).toEqual([]);
  });

  it('keeps a reading while the service cannot be reached and sends it later under the same id', async () => {
    client.post.mockRejectedValueOnce(new Error('Network Error'));
    renderPanel(panel());
    await userEvent.type(await cell('ohms across R1A'), '22{Enter}');
    expect(await screen.findByText(/cannot be reached/)).toBeInTheDocument();
    expect(localStorage.getItem('ohmstead.readings')).toContain('"part":"R1A"');
    window.dispatchEvent(new Event('online'));
    await waitFor(() => expect(screen.getByText('All readings are saved.')).toBeInTheDocument());
    const ids = sent().map(({ clientId }) => clientId);
    expect(ids).toHaveLength(2);
    expect(new Set(ids).size).toBe(1);
    expect(localStorage.getItem('ohmstead.readings')).not.toContain('"part":"R1A"');
  });

  it('shows a refusal of the service at the field', async () => {
    client.post.mockRejectedValueOnce({
      response: {
        status: 422,
        data: {
          title: 'Not taken',
          errors: [{ pointer: '/readings/0/value', message: 'Too high.' }],
        },
      },
    });
    renderPanel(panel());
    await userEvent.type(await cell('ohms across R1A'), '22{Enter}');
    const field = screen.getByLabelText('ohms across R1A');
    await waitFor(() => expect(field).toHaveAccessibleDescription('Too high.'));
  });

  it('sends a refused reading again on Enter', async () => {
    client.post.mockRejectedValueOnce({
      response: { status: 409, data: { title: 'Not yet', detail: 'Read the cautions first.' } },
    });
    renderPanel(panel());
    await userEvent.type(await cell('ohms across R1A'), '22{Enter}');
    const field = screen.getByLabelText('ohms across R1A');
    await waitFor(() => expect(field).toHaveAccessibleDescription('Read the cautions first.'));
    await userEvent.click(field);
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(sent()).toHaveLength(2));
    await waitFor(() => expect(field).toBeValid());
    expect(usePendingReadings.getState().pending).toEqual({});
  });

  it('takes the last change back', async () => {
    renderPanel(panel());
    await userEvent.type(await cell('ohms at Dropper lug 1'), '60{Enter}');
    await waitFor(() => expect(sent()).toHaveLength(1));
    await userEvent.click(screen.getByText('Undo'));
    await waitFor(() => expect(sent()).toHaveLength(2));
    expect(sent()[1]).toMatchObject({ at: ['B2', 'CHASSIS'], value: 'OL' });
    expect(await cell('ohms at Dropper lug 1')).toHaveValue('OL');
  });

  it('withdraws a reading whose field is cleared', async () => {
    renderPanel(panel());
    await userEvent.clear(await cell('ohms at Dropper lug 1'));
    await userEvent.keyboard('{Enter}');
    await waitFor(() => expect(client.delete).toHaveBeenCalledWith('/cases/c1/readings/2'));
    expect(await cell('ohms at Dropper lug 1')).toHaveValue('');
  });

  it('fills a pasted column downwards', async () => {
    renderPanel(panel());
    await userEvent.click(await cell('ohms across R1A'));
    await userEvent.paste('22.1\n15.2\nOL\n');
    await waitFor(() => expect(sent()).toHaveLength(3));
    expect(sent().map(({ part, value }) => [part, value])).toEqual([
      ['R1A', 22.1],
      ['R1B', 15.2],
      ['R1C', 'OL'],
    ]);
  });

  it('points out the next reading and jumps to it', async () => {
    renderPanel(panel());
    const note = await screen.findByRole('note', { name: 'Next reading' });
    expect(note).toHaveTextContent('Next: ohms across R1B, power off');
    await userEvent.click(screen.getByText('Enter it'));
    await waitFor(() => expect(screen.getByLabelText('ohms across R1B')).toHaveFocus());
  });

  it('asks for the cautions before powered readings and never before cold ones', async () => {
    const onNeedCautions = vi.fn();
    renderPanel(panel({ isCautionAcknowledged: false, onNeedCautions }));
    expect(await cell('AC volts at Dropper lug 2')).toHaveAttribute('readonly');
    expect(await cell('ohms across R1A')).not.toHaveAttribute('readonly');
    await userEvent.click(screen.getByText('Read the cautions'));
    expect(onNeedCautions).toHaveBeenCalledOnce();
  });

  it('takes one reading at a time with the number pad', async () => {
    renderPanel(panel());
    await userEvent.click(await screen.findByText('One at a time'));
    expect(screen.getByRole('heading', { name: 'Ohms across R1B' })).toBeInTheDocument();
    for (const key of ['1', '5', '.', '2']) {
      await userEvent.click(screen.getByRole('button', { name: key }));
    }
    await userEvent.click(screen.getByRole('button', { name: 'Enter' }));
    await waitFor(() => expect(sent()[0]).toMatchObject({ part: 'R1B', value: 15.2 }));
    expect(screen.getByRole('heading', { name: 'Ohms across V12' })).toBeInTheDocument();
  });

  it('says what is wrong with a way on when the readings cannot be fetched', async () => {
    client.get.mockRejectedValue(new Error('offline'));
    renderPanel(panel());
    expect(await screen.findByRole('button', { name: 'Try again' })).toBeInTheDocument();
  });
});
