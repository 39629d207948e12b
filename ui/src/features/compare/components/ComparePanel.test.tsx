import { type ComparePoint } from '@engine/diagnosis-types';
import { screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { apiClient } from '@/lib/api-client';
import { consoleString } from '@/testing/fixtures/circuits';
import { consoleReadings } from '@/testing/fixtures/diagnosis';
import { renderPanel } from '@/testing/fixtures/renderPanel';
import { ComparePanel } from './ComparePanel';

vi.mock('@/lib/api-client', () => ({ apiClient: { get: vi.fn() } }));
const get = vi.mocked(apiClient.get);

const lug: ComparePoint = {
  kind: 'point',
  key: 'ac-volts B3 CHASSIS',
  label: 'Dropper lug 2',
  take: 'ac-volts',
  at: ['B3', 'CHASSIS'],
  value: 96.2,
  low: 91,
  high: 101,
  published: 98,
  measured: 117.1,
  deviations: 9,
  order: 1,
};
const points: ComparePoint[] = [
  lug,
  {
    kind: 'part',
    key: 'ohms R1B',
    label: 'R1B',
    take: 'ohms',
    part: 'R1B',
    value: 15,
    low: 13.5,
    high: 16.5,
    measured: 'OL',
    order: 2,
  },
];

function panel(onShowWorking = vi.fn()) {
  return (
    <ComparePanel
      caseId="c1"
      netlist={consoleString}
      readings={consoleReadings}
      onShowWorking={onShowWorking}
    />
  );
}

beforeEach(() => {
  get.mockReset();
  get.mockResolvedValue({ data: { points, lineVolts: 117.4 } });
});

describe('ComparePanel', () => {
  it('has the same values in the plot and in the table', async () => {
    renderPanel(panel());
    const table = await screen.findByRole('table', { name: 'AC volts, measured and computed' });
    expect(within(table).getAllByRole('row')[1]).toHaveTextContent(
      'Dropper lug 2117.1 V96.2 V22 % high, far outside what tolerances allow91 to 101 V98 V',
    );
    expect(
      screen.getByRole('img', {
        name: /^Dropper lug 2: 117.1 V measured, 96.2 V computed: 22 % high/,
      }),
    ).toHaveAttribute('tabindex', '0');
  });

  it('switches between volts and ohms, and leads to the working of a part', async () => {
    const onShowWorking = vi.fn();
    renderPanel(panel(onShowWorking));
    await userEvent.click(await screen.findByRole('tab', { name: 'Ohms' }));
    const table = screen.getByRole('table', { name: 'Ohms, measured and computed' });
    expect(table).toHaveTextContent('open where a value is expected');
    await userEvent.click(within(table).getByRole('button', { name: 'Working for R1B' }));
    expect(onShowWorking).toHaveBeenCalledWith('R1B');
  });

  it('says what to do when there is nothing to compare', async () => {
    get.mockResolvedValue({ data: { points: [], lineVolts: 117 } });
    renderPanel(panel());
    expect(await screen.findByText('Nothing to compare yet')).toBeInTheDocument();
  });

  it('says what is wrong with a way on', async () => {
    get.mockRejectedValue(new Error('offline'));
    renderPanel(panel());
    expect(await screen.findByRole('button', { name: 'Try again' })).toBeInTheDocument();
  });
});
