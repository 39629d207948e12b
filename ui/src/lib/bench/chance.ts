/**
 * Says a probability the way people at a bench do, without percentages.
 *
 * @param probability between 0 and 1.
 * @returns "about 8 in 10", "about 3 in 100", "almost certain", "less than 1 in 100".
 */
export function chanceInWords(probability: number): string {
  if (!Number.isFinite(probability)) return 'not known';
  if (probability >= 0.985) return 'almost certain';
  if (probability >= 0.945) return 'about 19 in 20';
  if (probability >= 0.095) {
    const tenths = Math.min(9, Math.round(probability * 10));
    return `about ${tenths} in 10`;
  }
  if (probability >= 0.01) return `about ${Math.round(probability * 100)} in 100`;
  return 'less than 1 in 100';
}

/**
 * Says by how many times one reading speaks for or against a suspect.
 *
 * @param times likelihood ratio against "nothing is wrong": above 1 for, below 1 against.
 * @returns "12 times more likely", "3 times less likely", "about as likely either way".
 */
export function timesInWords(times: number): string {
  if (!(times > 0)) return 'hardly possible';
  const factor = times >= 1 ? times : 1 / times;
  if (factor < 1.25) return 'about as likely either way';
  const direction = times >= 1 ? 'more' : 'less';
  if (factor > 1000) return `over 1,000 times ${direction} likely`;
  return `${roundedFactor(factor)} times ${direction} likely`;
}

function roundedFactor(factor: number): string {
  if (factor < 10) return String(Math.round(factor * 10) / 10);
  if (factor < 100) return String(Math.round(factor));
  return String(Math.round(factor / 10) * 10);
}

/**
 * Says how much a reading would settle.
 *
 * @param bits expected gain over the suspects, at least 0.
 * @returns "would settle a great deal", "would settle much", "would settle some", "would settle little".
 */
export function gainInWords(bits: number): string {
  if (bits >= 1) return 'would settle a great deal';
  if (bits >= 0.5) return 'would settle much';
  if (bits >= 0.15) return 'would settle some';
  return 'would settle little';
}

/**
 * Says how far a measured value lies from the computed one.
 *
 * @param deviations (measured − computed) / standard deviation of tolerances and meter together.
 * @returns a short phrase that completes "The reading is …".
 */
export function deviationInWords(deviations: number): string {
  const size = Math.abs(deviations);
  if (size < 1) return 'well inside what tolerances allow';
  if (size < 2) return 'inside what tolerances allow';
  if (size < 3) return 'at the edge of what tolerances allow';
  if (size < 6) return 'outside what tolerances allow';
  return 'far outside what tolerances allow';
}

/**
 * Says how long a reading takes at the bench.
 *
 * @param minutes bench time, above 0.
 * @returns "under a minute", "about a minute", "about 4 minutes".
 */
export function minutesInWords(minutes: number): string {
  if (minutes < 0.8) return 'under a minute';
  if (minutes < 1.3) return 'about a minute';
  const rounded = minutes < 3 ? Math.round(minutes * 2) / 2 : Math.round(minutes);
  return `about ${rounded} minutes`;
}
