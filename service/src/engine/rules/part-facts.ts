import type { DiagnosisInput } from '../diagnosis-types';
import { withDefaults } from '../netlist/defaults';
import { isPictureTube } from '../netlist/picture-tube';
import type { Part, Reading } from '../netlist/types';
import { sectionsOf } from './case-facts';
import type { FactValues } from './facts';
import { latestOhms, latestOn } from './latest';
import { isAcross, makeOf } from './select';

/** The most a meter shows on ohms when it says nothing else (netlist document). */
const OVER_OHMS = 2e7;

/** Ohms a part has when cold; null for kinds an ohmmeter cannot judge. */
function coldOhms(part: Part): number | null {
  const filled = withDefaults(part);
  switch (filled.kind) {
    case 'heater':
    case 'lamp':
      return filled.volts / filled.amps / filled.coldRatio!;
    case 'thermistor':
      return filled.coldOhms;
    case 'resistor':
    case 'choke':
    case 'winding':
      return filled.ohms;
    default:
      return null;
  }
}

/** Ohms read over nominal ones; OL counts as the most that the meter shows. */
function ohmsRatio(part: Part, reading: Reading | undefined): number | null | undefined {
  const nominal = coldOhms(part);
  if (nominal === null) return null;
  if (reading?.value === undefined) return undefined;
  const ohms = reading.value === 'OL' ? (reading.meter?.overOhms ?? OVER_OHMS) : reading.value;
  return Math.max(ohms, 0) / nominal;
}

/** Volts read over rated ones, where a part has a rating for them. */
function voltsRatio(part: Part, readings: readonly Reading[]): number | null | undefined {
  const isHot = part.kind === 'heater' || part.kind === 'lamp';
  if (!isHot && part.kind !== 'capacitor') return null;
  if (part.volts === undefined) return null;
  const takes = isHot ? (['ac-volts', 'dc-volts'] as const) : (['dc-volts'] as const);
  const value = latestOn(readings, takes, part)?.value;
  return typeof value === 'number' ? Math.abs(value) / part.volts : undefined;
}

/**
 * Facts about one part, to be read beside those of the case.
 *
 * @param input the case, with its netlist as found.
 * @param healthyWatts watts of a part in a healthy set; asked only for resistors with a rating.
 */
export function partFacts(
  input: DiagnosisInput,
  part: Part,
  healthyWatts: (ref: string) => number | undefined,
): FactValues {
  const { netlist, readings, asFound = [] } = input;
  const ohms = latestOhms(readings, part);
  const volts = latestOn(readings, ['ac-volts', 'dc-volts'], part)?.value;
  const found = asFound.find((entry) =>
    entry.change === 'added' ? (entry.add as Part).ref === part.ref : entry.part === part.ref,
  );
  const rated = part.kind === 'resistor' ? part.watts : null;
  const watts = rated ? healthyWatts(part.ref) : undefined;
  const hasOhms = part.kind === 'resistor' || part.kind === 'choke' || part.kind === 'winding';
  return {
    kind: part.kind,
    make: makeOf(part) ?? null,
    asFound: found?.change ?? 'as-drawn',
    isPictureTube: isPictureTube(part),
    sectionCount: sectionsOf(netlist, part),
    lampsAcross: netlist.parts.filter((other) => other.kind === 'lamp' && isAcross(other, part))
      .length,
    ratedWatts: rated,
    wattsRatio: rated && watts !== undefined ? watts / rated : rated === null ? null : undefined,
    ohms: hasOhms ? part.ohms : null,
    ohmsRatio: ohmsRatio(part, ohms),
    isOpen: ohms?.value === undefined ? undefined : ohms.value === 'OL',
    voltsAcross: typeof volts === 'number' ? Math.abs(volts) : undefined,
    voltsRatio: voltsRatio(part, readings),
    seen: latestOn(readings, ['sign'], part)?.seen,
  };
}
