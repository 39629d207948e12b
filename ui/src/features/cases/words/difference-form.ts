import { type AsFound, type Part, type PartKind } from '@engine/netlist/types';
import { type Unit } from '@engine/units';
import { readQuantity } from '@/components/QuantityInput';

export type Change = AsFound['change'];

/** What the form for one difference holds; values as typed. */
export interface DifferenceForm {
  change: Change;
  part: string;
  /** Type number of what is fitted. */
  type: string;
  values: Record<string, string>;
  /** For an added part. */
  ref: string;
  kind: 'joint' | 'resistor' | 'capacitor';
  from: string;
  to: string;
}

export interface ValueField {
  name: string;
  label: string;
  unit: Unit;
}

const OHMS: ValueField = { name: 'ohms', label: 'Resistance', unit: 'Ω' };
const FARADS: ValueField = { name: 'farads', label: 'Capacitance', unit: 'F' };
const VOLTS: ValueField = { name: 'volts', label: 'Heater volts', unit: 'V' };
const AMPS: ValueField = { name: 'amps', label: 'Heater current', unit: 'A' };

const VALUE_FIELDS: Partial<Record<PartKind, ValueField[]>> = {
  resistor: [OHMS],
  capacitor: [FARADS],
  choke: [{ name: 'henries', label: 'Inductance', unit: 'H' }, OHMS],
  thermistor: [
    { name: 'hotOhms', label: 'Resistance, hot', unit: 'Ω' },
    { name: 'coldOhms', label: 'Resistance, cold', unit: 'Ω' },
  ],
  winding: [{ name: 'volts', label: 'Volts', unit: 'V' }],
  load: [{ name: 'amps', label: 'Current', unit: 'A' }],
  heater: [VOLTS, AMPS],
  lamp: [
    { ...VOLTS, label: 'Lamp volts' },
    { ...AMPS, label: 'Lamp current' },
  ],
};

/** True when another type can be fitted in this part's place. */
export function hasType(kind: PartKind): boolean {
  return kind === 'heater' || kind === 'lamp';
}

/** What a rectifier is made of, for one that was replaced by another kind. */
export const RECTIFIER_MAKES = ['vacuum', 'selenium', 'silicon'] as const;

/** Values that a difference asks for. */
export function valueFields(change: Change, kind: PartKind): ValueField[] {
  if (change === 'bridged' || change === 'missing') return [];
  return VALUE_FIELDS[kind] ?? [];
}

/**
 * Makes a difference from what was typed.
 *
 * @param form the form.
 * @param parts parts of the drawing.
 * @returns the difference, or what is wrong by field.
 */
export function differenceOf(
  form: DifferenceForm,
  parts: readonly Part[],
): { ok: true; entry: AsFound } | { ok: false; messages: Record<string, string> } {
  const messages: Record<string, string> = {};
  const part = parts.find(({ ref }) => ref === form.part);
  const kind = form.change === 'added' ? form.kind : part?.kind;
  if (form.change !== 'added' && !part) messages.part = 'Choose the part that differs.';
  const values: Record<string, number> = {};
  for (const { name, unit } of kind ? valueFields(form.change, kind) : []) {
    const read = readQuantity(form.values[name] ?? '', unit);
    if (!read.ok) messages[name] = read.message;
    else if (read.value !== undefined) values[name] = read.value;
  }
  if (form.change === 'added') {
    if (!/^[A-Za-z0-9_-]{1,24}$/.test(form.ref))
      messages.ref = 'Give it a reference of letters and digits, such as R101.';
    else if (parts.some(({ ref }) => ref === form.ref))
      messages.ref = `${form.ref} is on the drawing already; choose another reference.`;
    if (!form.from) messages.from = 'Choose the node it starts at.';
    if (!form.to) messages.to = 'Choose the node it ends at.';
    else if (form.to === form.from) messages.to = 'A part lies between two different nodes.';
    const needed = form.kind === 'resistor' ? 'ohms' : form.kind === 'capacitor' ? 'farads' : '';
    if (needed && values[needed] === undefined)
      messages[needed] ??= 'Give its value, such as 4.7k.';
  } else if (form.change === 'fitted' || form.change === 'value') {
    if (kind === 'rectifier') {
      if (!form.type) messages.type = 'Choose what kind of rectifier is there now.';
    } else if (kind && Object.keys(values).length === 0 && Object.keys(messages).length === 0)
      messages[valueFields(form.change, kind)[0]?.name ?? 'part'] =
        'Say what is there now; the computed values need it.';
  }
  if (Object.keys(messages).length > 0) return { ok: false, messages };
  return { ok: true, entry: entryOf(form, kind!, values) };
}

function entryOf(form: DifferenceForm, kind: PartKind, values: Record<string, number>): AsFound {
  if (form.change === 'added') {
    const between: [string, string] = [form.from, form.to];
    return { change: 'added', add: { ref: form.ref, kind: form.kind, between, ...values } as Part };
  }
  if (form.change === 'bridged' || form.change === 'missing')
    return { part: form.part, change: form.change };
  const typed = form.type.trim();
  if (kind === 'rectifier') return { part: form.part, change: form.change, make: typed };
  const type = form.change === 'fitted' && typed && hasType(kind);
  return {
    part: form.part,
    change: form.change,
    ...values,
    ...(type && { [kind === 'lamp' ? 'lamp' : 'tube']: typed }),
  };
}
