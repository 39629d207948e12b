import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { apiClient } from '@/lib/api-client';
import { consoleString } from '@/testing/fixtures/circuits';
import { buildDiagnosisResult, consoleReadings } from '@/testing/fixtures/diagnosis';
import { renderPanel } from '@/testing/fixtures/renderPanel';
import { SuspectsPanel, type SuspectsPanelProps } from './SuspectsPanel';

vi.mock('@/lib/api-client', () => ({ apiClient: { get: vi.fn(), post: vi.fn() } }));
const post = vi.mocked(apiClient.post);

function answer(overrides = {}) {
  return {
    data: {
      id: 1,
      at: '2026-01-01T00:00:00Z',
      engineVersion: 'test',
      ms: 40,
      readingIds: consoleReadings.map(({ id }) => id),
      result: buildDiagnosisResult(overrides),
    },
  };
}

function panel(props: Partial<SuspectsPanelProps> = {}) {
  return (
    <SuspectsPanel caseId="c1" netlist={consoleString} readings={consoleReadings} {...props} />
  );
}

beforeEach(() => {
  post.mockReset();
  post.mockResolvedValue(answer());
});

describe('SuspectsPanel', () => {
  it('asks for a first reading when there is none, and does not call the service', () => {
    renderPanel(panel({ readings: [] }));
    expect(screen.getByText(/No readings yet/)).toBeInTheDocument();
    expect(post).not.toHaveBeenCalled();
  });

  it('ranks suspects with their chance in words', async () => {
    renderPanel(panel());
    const card = await screen.findByRole('article', { name: 'R1B open' });
    expect(card).toHaveTextContent('about 8 in 10');
    expect(card).toHaveTextContent('No current flows past lug 2.');
    expect(card).toHaveTextContent('Lamp first.');
    const rows = within(card).getAllByRole('row');
    expect(rows[1]).toHaveTextContent(
      'AC volts at Dropper lug 2117.1 V117 V (112 to 121 V)230 times',
    );
  });

  it('brackets what cannot be told apart with what would separate it', async () => {
    renderPanel(panel());
    const bracket = await screen.findByRole('region', { name: /cannot be told apart yet/ });
    expect(within(bracket).getAllByRole('article')).toHaveLength(2);
    expect(bracket).toHaveTextContent('What would separate them: ohms across V12, power off');
    expect(bracket).toHaveTextContent(
      'V13 would need about 3.2 times its usual value, between 2 and 8 times',
    );
  });

  it('offers the suggested readings for entering', async () => {
    const onEnterReading = vi.fn();
    renderPanel(panel({ onEnterReading }));
    const button = await screen.findByRole('button', {
      name: 'Enter this reading: ohms across R1B, power off',
    });
    await userEvent.click(button);
    expect(onEnterReading).toHaveBeenCalledWith({ take: 'ohms', part: 'R1B' });
  });

  it('says cautions, what to take again, remarks and waiting rules', async () => {
    renderPanel(panel());
    expect(await screen.findByText(/Use an isolation transformer/)).toBeInTheDocument();
    expect(screen.getByText(/Ohms at Dropper lug 1 gave OL/)).toBeInTheDocument();
    expect(screen.getByText(/have not been tested yet/)).toBeInTheDocument();
    expect(screen.getByText('Tired thermistor: ohms across RT1')).toBeInTheDocument();
  });

  it('says when none of the suspects explains the readings', async () => {
    post.mockResolvedValue(answer({ noneOfThese: true }));
    renderPanel(panel());
    expect(await screen.findByText('Perhaps none of these')).toBeInTheDocument();
  });

  it('keeps the suspects dimmed while a changed reading is weighed again', async () => {
    const { rerender } = renderPanel(panel());
    await screen.findByRole('article', { name: 'R1B open' });
    post.mockReturnValue(new Promise(() => {}));
    rerender(panel({ readings: [...consoleReadings, { ...consoleReadings[0], id: 9 }] }));
    expect(await screen.findByText('Weighing the readings again…')).toBeInTheDocument();
    expect(screen.getByRole('article', { name: 'R1B open' })).toBeInTheDocument();
    await vi.waitFor(() => expect(post).toHaveBeenCalledTimes(2));
  });

  it('asks once for readings that arrive after it', async () => {
    const { rerender } = renderPanel(panel({ readings: [] }));
    rerender(panel());
    await screen.findByRole('article', { name: 'R1B open' });
    expect(post).toHaveBeenCalledOnce();
  });

  it('says what is wrong with a way on when the service fails', async () => {
    post.mockRejectedValue(new Error('offline'));
    renderPanel(panel());
    const retry = await screen.findByRole('button', { name: 'Try again' }, { timeout: 4000 });
    expect(screen.getByRole('alert')).toHaveTextContent('The service cannot be reached.');
    post.mockResolvedValue(answer());
    await userEvent.click(retry);
    expect(await screen.findByRole('article', { name: 'R1B open' })).toBeInTheDocument();
  });
});
