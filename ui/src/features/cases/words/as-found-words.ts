import { type AsFound, type Part } from '@engine/netlist/types';
import { formatQuantity, type Unit } from '@engine/units';
import { KIND_WORDS, partValue } from '@/lib/bench/part-words';

const FIELD_UNITS: Record<string, Unit> = {
  ohms: 'Ω',
  hotOhms: 'Ω',
  coldOhms: 'Ω',
  esr: 'Ω',
  farads: 'F',
  henries: 'H',
  volts: 'V',
  dropVolts: 'V',
  amps: 'A',
  watts: 'W',
};

/**
 * Says in a sentence how a set differs from its drawing.
 *
 * @param entry one difference.
 * @param parts parts of the drawing, for what stood there before.
 * @returns a sentence such as "R12 is 82 Ω; the drawing says 100 Ω."
 */
export function asFoundInWords(entry: AsFound, parts: readonly Part[]): string {
  if (entry.change === 'added') {
    const { add } = entry;
    const kind = add.kind === 'joint' ? 'wire' : KIND_WORDS[add.kind];
    const what = [aOrAn(kind), partValue(add)].filter(Boolean).join(' of ');
    return `${add.ref}, ${what}, was added from ${add.between[0]} to ${add.between[1]}.`;
  }
  const before = parts.find(({ ref }) => ref === entry.part);
  const drawn = before ? partValue(before) : '';
  if (entry.change === 'bridged') return `${entry.part} is bridged with a wire.`;
  if (entry.change === 'missing') return `${entry.part} is missing.`;
  const now = valuesInWords(entry);
  const verb = entry.change === 'fitted' ? 'has another one fitted:' : 'is';
  return `${entry.part} ${verb} ${now}${drawn ? `; the drawing says ${drawn}` : ''}.`;
}

function valuesInWords(entry: Record<string, unknown>): string {
  return Object.entries(entry)
    .filter(([name]) => !['part', 'change', 'note'].includes(name))
    .map(([name, value]) => {
      if (typeof value !== 'number') return String(value);
      const unit = FIELD_UNITS[name];
      return unit ? formatQuantity(value, unit) : `${name} ${value}`;
    })
    .join(', ');
}

function aOrAn(word: string): string {
  return `${/^[aeiou]/.test(word) ? 'an' : 'a'} ${word}`;
}
