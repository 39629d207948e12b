import { type AsFound, type Netlist } from '@engine/netlist/types';
import { Button, Field, Input, makeStyles, Select, tokens } from '@fluentui/react-components';
import { useMemo, useState } from 'react';
import { QuantityInput } from '@/components/QuantityInput';
import {
  type Change,
  type DifferenceForm,
  differenceOf,
  hasType,
  RECTIFIER_MAKES,
  valueFields,
} from '../words/difference-form';

const useStyles = makeStyles({
  root: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 260px), 1fr))',
    alignItems: 'start',
    gap: tokens.spacingHorizontalM,
  },
  actions: { gridColumn: '1 / -1', display: 'flex', gap: tokens.spacingHorizontalM },
});

const EMPTY: DifferenceForm = {
  change: 'fitted',
  part: '',
  type: '',
  values: {},
  ref: '',
  kind: 'joint',
  from: '',
  to: '',
};

const CHANGES: [Change, string][] = [
  ['fitted', 'Another type is fitted'],
  ['value', 'It has another value'],
  ['bridged', 'It is bridged with a wire'],
  ['missing', 'It is missing'],
  ['added', 'A part or wire was added'],
];

interface AddDifferenceFormProps {
  netlist: Netlist;
  isSaving: boolean;
  onAdd: (entry: AsFound) => void;
  onCancel: () => void;
}

/** Asks for one difference between this set and its drawing. */
export function AddDifferenceForm({ netlist, isSaving, onAdd, onCancel }: AddDifferenceFormProps) {
  const styles = useStyles();
  const [form, setForm] = useState(EMPTY);
  const [messages, setMessages] = useState<Record<string, string>>({});
  const nodes = useMemo(
    () => [...new Set(netlist.parts.flatMap(({ between }) => between))].sort(),
    [netlist],
  );
  const part = netlist.parts.find(({ ref }) => ref === form.part);
  const kind = form.change === 'added' ? form.kind : part?.kind;
  const parts =
    form.change === 'fitted'
      ? netlist.parts.filter(({ kind: of }) => hasType(of) || of === 'rectifier')
      : netlist.parts.filter(
          ({ kind: of }) => valueFields(form.change, of).length > 0 || form.change !== 'value',
        );
  const put = (change: Partial<DifferenceForm>) => {
    setForm((old) => ({ ...old, ...change }));
    setMessages({});
  };
  const select = (name: 'part' | 'from' | 'to', label: string, options: string[]) => (
    <Field label={label} required validationMessage={messages[name]}>
      <Select
        size="large"
        value={form[name]}
        onChange={(_event, { value }) => put({ [name]: value })}
      >
        <option value="">Choose</option>
        {options.map((option) => (
          <option key={option}>{option}</option>
        ))}
      </Select>
    </Field>
  );
  const add = (event: React.FormEvent) => {
    event.preventDefault();
    const made = differenceOf(form, netlist.parts);
    if (made.ok) onAdd(made.entry);
    else setMessages(made.messages);
  };
  return (
    <form className={styles.root} noValidate aria-label="Add a difference" onSubmit={add}>
      <Field label="What differs">
        <Select
          size="large"
          value={form.change}
          onChange={(_event, { value }) =>
            put({ change: value as Change, part: '', type: '', values: {} })
          }
        >
          {CHANGES.map(([value, label]) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </Select>
      </Field>
      {form.change !== 'added' &&
        select(
          'part',
          'Part',
          parts.map(({ ref }) => ref),
        )}
      {form.change === 'added' && (
        <>
          <Field label="Kind">
            <Select
              size="large"
              value={form.kind}
              onChange={(_event, { value }) =>
                put({ kind: value as DifferenceForm['kind'], values: {} })
              }
            >
              <option value="joint">Wire</option>
              <option value="resistor">Resistor</option>
              <option value="capacitor">Capacitor</option>
            </Select>
          </Field>
          <Field label="Reference" required validationMessage={messages.ref}>
            <Input
              size="large"
              value={form.ref}
              onChange={(_event, { value }) => put({ ref: value })}
            />
          </Field>
          {select('from', 'From node', nodes)}
          {select('to', 'To node', nodes)}
        </>
      )}
      {form.change === 'fitted' && kind === 'rectifier' && (
        <Field label="Kind of rectifier" required validationMessage={messages.type}>
          <Select
            size="large"
            value={form.type}
            onChange={(_event, { value }) => put({ type: value })}
          >
            <option value="">Choose</option>
            {RECTIFIER_MAKES.map((make) => (
              <option key={make}>{make}</option>
            ))}
          </Select>
        </Field>
      )}
      {form.change === 'fitted' && kind && hasType(kind) && (
        <Field label="Type number" hint="As printed on it, if it can be read.">
          <Input
            size="large"
            value={form.type}
            onChange={(_event, { value }) => put({ type: value })}
          />
        </Field>
      )}
      {kind &&
        valueFields(form.change, kind).map(({ name, label, unit }) => (
          <QuantityInput
            key={name}
            label={label}
            unit={unit}
            text={form.values[name] ?? ''}
            message={messages[name]}
            onChange={(_event, { text }) => put({ values: { ...form.values, [name]: text } })}
          />
        ))}
      <div className={styles.actions}>
        <Button type="submit" appearance="primary" size="large" disabled={isSaving}>
          {isSaving ? 'Saving…' : 'Add the difference'}
        </Button>
        <Button size="large" onClick={onCancel}>
          Cancel
        </Button>
      </div>
    </form>
  );
}
