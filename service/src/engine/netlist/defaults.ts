import type { CapacitorMake, Part, RectifierMake } from './types';

/** Forward drop and series resistance of rectifiers by make (netlist document). */
export const RECTIFIER_DEFAULTS: Record<RectifierMake, { dropVolts: number; ohms: number }> = {
  vacuum: { dropVolts: 10, ohms: 100 },
  selenium: { dropVolts: 5, ohms: 10 },
  silicon: { dropVolts: 0.7, ohms: 0.1 },
};

/** Equivalent series resistance of a capacitor by make, ohms. */
export function defaultEsr(make: CapacitorMake): number {
  return make === 'electrolytic' ? 2 : 0.1;
}

/**
 * Fills every optional physical field of a part with the default of the netlist document.
 *
 * @returns a copy; the part itself is left as it is.
 */
export function withDefaults(part: Part): Part {
  switch (part.kind) {
    case 'resistor':
      return { tolerance: 0.1, make: 'composition', ...part };
    case 'heater':
      return { tolerance: 0.05, coldRatio: 6, exponent: 0.6, ...part };
    case 'lamp':
      return { tolerance: 0.1, coldRatio: 10, exponent: 0.55, ...part };
    case 'thermistor':
      return { tolerance: 0.15, exponent: -1.2, ...part };
    case 'switch':
    case 'fuse':
    case 'joint':
      return { ohms: 0.05, ...part };
    case 'capacitor': {
      const make = part.make ?? 'film';
      return { tolerance: 0.2, make, esr: defaultEsr(make), ...part };
    }
    case 'rectifier': {
      const make = part.make ?? 'silicon';
      return { make, ...RECTIFIER_DEFAULTS[make], ...part };
    }
    case 'choke':
      return { tolerance: 0.1, ...part };
    case 'winding':
      return { tolerance: 0.1, phase: 0, ...part };
    case 'load':
      return { tolerance: 0.2, exponent: 1, ...part };
  }
}
