import { type Part, type PartKind } from '@engine/netlist/types';
import { formatQuantity, type Unit } from '@engine/units';

/** What each kind of part is called in a sentence. */
export const KIND_WORDS: Record<PartKind, string> = {
  resistor: 'resistor',
  heater: 'heater',
  lamp: 'lamp',
  thermistor: 'thermistor',
  switch: 'switch',
  fuse: 'fuse',
  joint: 'joint',
  capacitor: 'capacitor',
  rectifier: 'rectifier',
  choke: 'choke',
  winding: 'winding',
  load: 'load',
};

const MAKE_WORDS: Partial<Record<string, string>> = {
  vacuum: 'vacuum',
  selenium: 'selenium',
  silicon: 'silicon',
};

function quantity(value: number | undefined, unit: Unit): string {
  return value === undefined || !Number.isFinite(value) ? '' : formatQuantity(value, unit);
}

function joined(...words: string[]): string {
  return words.filter((word) => word !== '').join(' ');
}

/**
 * Gives the value of a part as a drawing prints it.
 *
 * @param part any part; values in SI units.
 * @returns "15 Ω", "12BA6", "6.3 V 150 mA", "47 µF"; empty for a switch, a fuse or a joint.
 */
export function partValue(part: Part): string {
  switch (part.kind) {
    case 'resistor':
      return quantity(part.ohms, 'Ω');
    case 'heater':
      return part.tube ?? joined(quantity(part.volts, 'V'), quantity(part.amps, 'A'));
    case 'lamp':
      return part.lamp ?? joined(quantity(part.volts, 'V'), quantity(part.amps, 'A'));
    case 'thermistor':
      return quantity(part.hotOhms, 'Ω') + ' hot';
    case 'capacitor':
      return quantity(part.farads, 'F');
    case 'rectifier':
      return MAKE_WORDS[part.make ?? ''] ?? '';
    case 'choke':
      return quantity(part.henries, 'H');
    case 'winding':
      return quantity(part.volts, 'V');
    case 'load':
      return joined(quantity(part.volts, 'V'), quantity(part.amps, 'A'));
    case 'switch':
    case 'fuse':
    case 'joint':
      return '';
  }
}
