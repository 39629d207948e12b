import type { Part, Reading, Take } from '../netlist/types';

/** True when a reading was taken across this part: on the part, or with the leads on its two ends. */
function isOn({ part, at }: Reading, own: Part): boolean {
  if (part !== undefined) return part === own.ref;
  return at !== undefined && own.between.every((node) => at.includes(node));
}

/** The last reading of one of these kinds across a part. */
export function latestOn(
  readings: readonly Reading[],
  takes: readonly Take[],
  part: Part,
): Reading | undefined {
  return readings.findLast((reading) => takes.includes(reading.take) && isOn(reading, part));
}

/** The last ohms across a part; with one end lifted if there is such a reading, else in circuit. */
export function latestOhms(readings: readonly Reading[], part: Part): Reading | undefined {
  return latestOn(readings, ['lifted-ohms'], part) ?? latestOn(readings, ['ohms'], part);
}
