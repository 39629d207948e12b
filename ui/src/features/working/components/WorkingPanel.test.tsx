import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { apiClient } from '@/lib/api-client';
import { consoleString } from '@/testing/fixtures/circuits';
import { renderPanel } from '@/testing/fixtures/renderPanel';
import { type Working } from '../api/get-working';
import { WorkingPanel } from './WorkingPanel';

vi.mock('@/lib/api-client', () => ({ apiClient: { get: vi.fn(), post: vi.fn() } }));
const client = vi.mocked(apiClient);

const working: Working = {
  nodes: ['B2', 'B3'],
  equations: [
    { node: 'B2', text: '(117 - vB2)/12 = (vB2 - vB3)/22' },
    { node: 'B3', text: 'the rest in words' },
  ],
  solution: { B2: 109.9, B3: 96.2 },
  notes: ['Heaters stand as fixed resistances.'],
  residual: 2e-12,
  agreesWithSolver: true,
};
const readings = [
  { id: 7, take: 'ac-volts' as const, at: ['B4', 'CHASSIS'] as [string, string], value: 71 },
];

function panel() {
  return <WorkingPanel caseId="c1" netlist={consoleString} readings={readings} part="R1B" />;
}

beforeEach(() => {
  client.get.mockReset();
  client.post.mockReset();
  client.get.mockResolvedValue({ data: working });
});

describe('WorkingPanel', () => {
  it('shows equations, solution and how far to trust them', async () => {
    renderPanel(panel());
    const equation = await screen.findByLabelText('(117 - vB2)/12 = (vB2 - vB3)/22');
    expect(equation.querySelectorAll('mfrac')).toHaveLength(2);
    expect(screen.getByText('the rest in words')).toBeInTheDocument();
    expect(screen.getByRole('table', { name: 'Solution of the equations' })).toHaveTextContent(
      'Dropper lug 1109.9 V',
    );
    expect(screen.getByText(/A second, numeric solution agrees/)).toBeInTheDocument();
  });

  it('says so when the two solutions disagree', async () => {
    client.get.mockResolvedValue({ data: { ...working, residual: 0.02, agreesWithSolver: false } });
    renderPanel(panel());
    expect(await screen.findByText(/does not agree/)).toHaveTextContent('do not rely on it');
  });

  it('finds the value that a part would need', async () => {
    client.post.mockResolvedValue({
      data: {
        part: 'R1B',
        reading: readings[0],
        text: 'v = 76.3 + 812/(x + 54.9)',
        impliedValue: 131.7,
        unit: 'ohms',
        note: '',
      },
    });
    renderPanel(panel());
    await userEvent.click(await screen.findByRole('button', { name: 'Find the value' }));
    expect(await screen.findByText('R1B would have to be 132 Ω.')).toBeInTheDocument();
    expect(client.post).toHaveBeenCalledWith('/cases/c1/working/closed-form', {
      part: 'R1B',
      take: 'ac-volts',
      at: ['B4', 'CHASSIS'],
      readingPart: undefined,
    });
  });

  it('tells at the field why a reading cannot be traced', async () => {
    client.post.mockRejectedValue({
      response: {
        status: 422,
        data: { title: 'No', detail: 'This reading does not hang on R1B.' },
      },
    });
    renderPanel(panel());
    await userEvent.click(await screen.findByRole('button', { name: 'Find the value' }));
    expect(await screen.findByText('This reading does not hang on R1B.')).toBeInTheDocument();
  });
});
