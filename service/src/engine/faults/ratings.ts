/** A heater or lamp rating that may have been fitted by mistake, and its share among the mistakes. */
export interface Rating {
  volts: number;
  amps: number;
  share: number;
}

/**
 * The distinct ratings that differ from the right one; ratings nearer to each other than `nearness`
 * (in ln of volts and of amps) count as one. A rating that many types have is a likelier mistake,
 * by the square root of their number (assumption: drawers hold a few of each type).
 *
 * @param right rating that belongs there.
 * @param data ratings of all known types.
 */
export function fittingRatings(
  right: { volts: number; amps: number },
  data: readonly { volts: number; amps: number }[],
  nearness: number,
): Rating[] {
  const groups: { volts: number; amps: number; count: number }[] = [];
  const isNear = (x: { volts: number; amps: number }, y: { volts: number; amps: number }) =>
    Math.abs(Math.log(x.volts / y.volts)) <= nearness &&
    Math.abs(Math.log(x.amps / y.amps)) <= nearness;
  const sorted = [...data].sort((x, y) => x.volts - y.volts || x.amps - y.amps);
  for (const rating of sorted) {
    if (isNear(rating, right)) continue;
    const group = groups.find((other) => isNear(rating, other));
    if (group) group.count += 1;
    else groups.push({ volts: rating.volts, amps: rating.amps, count: 1 });
  }
  const total = groups.reduce((sum, { count }) => sum + Math.sqrt(count), 0);
  return groups.map(({ volts, amps, count }) => ({
    volts,
    amps,
    share: Math.sqrt(count) / total,
  }));
}
