import { type Netlist } from '@engine/netlist/types';
import { formatQuantity } from '@engine/units';
import {
  Button,
  Field,
  makeStyles,
  Select,
  Spinner,
  Text,
  tokens,
} from '@fluentui/react-components';
import { type FormEvent, useState } from 'react';
import { type CaseReading } from '@/lib/bench/case-reading';
import { partValue } from '@/lib/bench/part-words';
import { labelForReading } from '@/lib/bench/places';
import { problemInWords } from '@/lib/bench/problem';
import { readingInWords } from '@/lib/bench/quantities';
import { useClosedForm } from '../api/find-closed-form';
import { MathLine } from './MathLine';

interface ClosedFormFormProps {
  caseId: string;
  netlist: Netlist;
  readings: readonly CaseReading[];
  /** Part chosen at first; give a key with it to choose another later. */
  part?: string;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalM },
  form: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    gap: tokens.spacingHorizontalM,
    margin: 0,
  },
  field: { flexBasis: '200px', flexGrow: 1, maxWidth: '360px' },
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
  scroll: { overflowX: 'auto' },
  implied: {
    display: 'block',
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
    fontWeight: tokens.fontWeightSemibold,
    fontVariantNumeric: 'tabular-nums',
  },
});

/** One reading as a formula in one part's value: what would this part have to measure? */
export function ClosedFormForm({ caseId, netlist, readings, part }: ClosedFormFormProps) {
  const styles = useStyles();
  // The line itself hangs on no part.
  const usable = readings.filter(
    ({ take, value, at }) =>
      take !== 'sign' && typeof value === 'number' && at?.[0] !== netlist.line?.hot,
  );
  const [chosenPart, setChosenPart] = useState(part ?? firstChoice(netlist));
  const [chosenReading, setChosenReading] = useState('');
  const closedForm = useClosedForm(caseId);
  const reading = usable.find(({ id }) => String(id) === chosenReading) ?? usable[0];

  if (!reading) {
    return <Text>Enter a reading with a value first; then it can be traced to one part.</Text>;
  }
  const handleSubmit = (event: FormEvent) => {
    event.preventDefault();
    closedForm.mutate({
      part: chosenPart,
      take: reading.take,
      at: reading.at,
      readingPart: reading.part,
    });
  };
  const answer = closedForm.data;
  const marked = netlist.parts.find(({ ref }) => ref === answer?.part);
  return (
    <div className={styles.root}>
      <form className={styles.form} onSubmit={handleSubmit} aria-label="Trace a reading to a part">
        <Field label="Part" className={styles.field}>
          <Select value={chosenPart} onChange={(_event, { value }) => setChosenPart(value)}>
            {netlist.parts.map((one) => (
              <option key={one.ref} value={one.ref}>
                {[one.ref, partValue(one)].filter(Boolean).join(', ')}
              </option>
            ))}
          </Select>
        </Field>
        <Field
          label="Reading"
          className={styles.field}
          validationState={closedForm.isError ? 'error' : 'none'}
          validationMessage={closedForm.isError ? problemInWords(closedForm.error) : undefined}
        >
          <Select value={reading.id} onChange={(_event, { value }) => setChosenReading(value)}>
            {usable.map((one) => (
              <option key={one.id} value={one.id}>
                {labelForReading(netlist, one)}: {readingInWords(one)}
              </option>
            ))}
          </Select>
        </Field>
        <Button type="submit" appearance="primary" className={styles.button}>
          Find the value
        </Button>
      </form>
      {closedForm.isPending && <Spinner size="tiny" label="Solving for the part" />}
      {answer && !closedForm.isPending && (
        <div role="status">
          <Text className={styles.implied}>
            {answer.impliedValue === null
              ? `No value of ${answer.part} explains this reading.`
              : `${answer.part} would have to be ${formatQuantity(answer.impliedValue, 'Ω')}.`}
          </Text>
          {marked && partValue(marked) && <Text block>It is marked {partValue(marked)}.</Text>}
          <div className={styles.scroll} role="group" aria-label="Formula" tabIndex={0}>
            <MathLine text={answer.text} mathml={answer.mathml} />
          </div>
          {answer.note && <Text block>{answer.note}</Text>}
        </div>
      )}
    </div>
  );
}

/** A resistor is what most often has drifted; else the first part there is. */
function firstChoice(netlist: Netlist): string {
  const resistor = netlist.parts.find(({ kind }) => kind === 'resistor');
  return (resistor ?? netlist.parts[0])?.ref ?? '';
}
