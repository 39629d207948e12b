import { screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { consoleString } from '@/testing/fixtures/circuits';
import { renderPanel } from '@/testing/fixtures/renderPanel';
import { SchematicView } from './SchematicView';

// jsdom lays nothing out: give the canvas the size of a desk's screen.
beforeEach(() => {
  vi.spyOn(HTMLElement.prototype, 'clientWidth', 'get').mockReturnValue(1200);
  vi.spyOn(HTMLElement.prototype, 'clientHeight', 'get').mockReturnValue(560);
});

describe('SchematicView', () => {
  it('names parts with their suspicion and how they were found, in the order of the string', async () => {
    renderPanel(
      <SchematicView
        netlist={consoleString}
        asFound={[{ part: 'R1C', change: 'bridged' }]}
        suspects={[{ part: 'R1B', probability: 0.81 }]}
      />,
    );
    const names = (await screen.findAllByRole('button', { hidden: true }))
      .map((button) => button.getAttribute('aria-label') ?? '')
      .filter((name) => name.startsWith('R1'));
    expect(names).toEqual([
      'R1A, resistor, 22 Ω, section of R1',
      'R1B, resistor, 15 Ω, section of R1, suspect about 8 in 10',
      'R1C, resistor, 18 Ω, section of R1, as found: bridged',
    ]);
  });

  it('tells which part was chosen', async () => {
    const onSelectPart = vi.fn();
    renderPanel(<SchematicView netlist={consoleString} onSelectPart={onSelectPart} />);
    await userEvent.click(await screen.findByLabelText(/^DS1, lamp/), { pointerEventsCheck: 0 });
    expect(onSelectPart).toHaveBeenCalledWith('DS1');
  });

  it('lists the values at the nodes for those who do not see the drawing', () => {
    renderPanel(
      <SchematicView
        netlist={consoleString}
        values={{ B3: { measured: '117.1 V', computed: '96.2 V' } }}
      />,
    );
    expect(
      screen.getByText('Dropper lug 2, measured 117.1 V, computed 96.2 V'),
    ).toBeInTheDocument();
  });

  it('says what to do with an empty circuit', () => {
    renderPanel(<SchematicView netlist={{ ...consoleString, parts: [] }} />);
    expect(screen.getByText(/has no parts yet/)).toBeInTheDocument();
  });
});
