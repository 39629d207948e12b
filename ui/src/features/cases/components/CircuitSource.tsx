import { Field, makeStyles, Radio, RadioGroup, Select, tokens } from '@fluentui/react-components';
import { type Control, useController, useWatch } from 'react-hook-form';
import { FileButton } from '@/components/FileButton';
import { TextField } from '@/components/TextField';
import { type FamilySummary } from '@/lib/api-model';
import { type OpenCaseForm } from '../api/open-case';

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalM },
  line: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fit, minmax(min(100%, 220px), 1fr))',
    gap: tokens.spacingHorizontalM,
  },
});

interface CircuitSourceProps {
  control: Control<OpenCaseForm>;
  families: readonly FamilySummary[];
  familiesMessage?: string;
  /** A file was read into this field. */
  onFile: (field: 'netlistText' | 'csv', text: string) => void;
}

/** Where the circuit of a new case comes from: a family, a netlist, or a table of parts. */
export function CircuitSource({ control, families, familiesMessage, onFile }: CircuitSourceProps) {
  const styles = useStyles();
  const { field: sourceField } = useController({ control, name: 'source' });
  const {
    field: { ref: familyRef, onBlur: leaveFamily, onChange: chooseFamily, value: familyId },
    fieldState: familyState,
  } = useController({ control, name: 'familyId' });
  const chosen = useWatch({ control, name: 'source' });
  return (
    <div className={styles.root}>
      <Field label="Circuit">
        <RadioGroup value={chosen} onChange={(_event, { value }) => sourceField.onChange(value)}>
          <Radio value="family" label="From a chassis family" />
          <Radio value="json" label="From a netlist (JSON)" />
          <Radio value="csv" label="From a table of parts (CSV)" />
        </RadioGroup>
      </Field>
      {chosen === 'family' && (
        <Field
          label="Family"
          required
          hint={familiesMessage}
          validationMessage={familyState.error?.message}
        >
          <Select
            ref={familyRef}
            size="large"
            value={familyId}
            onBlur={leaveFamily}
            onChange={(_event, { value }) => chooseFamily(value)}
          >
            <option value="">Choose a family</option>
            {families.map(({ id, name }) => (
              <option key={id} value={id}>
                {name}
              </option>
            ))}
          </Select>
        </Field>
      )}
      {chosen === 'json' && (
        <>
          <TextField
            control={control}
            name="netlistText"
            label="Netlist"
            lines={7}
            isCode
            isRequired
            placeholder='{ "ohmstead": 1, "title": "…", "reference": "chassis", "parts": [ … ] }'
          />
          <FileButton
            accept=".json,application/json"
            onRead={(text) => onFile('netlistText', text)}
          >
            Choose a netlist file
          </FileButton>
        </>
      )}
      {chosen === 'csv' && (
        <>
          <TextField
            control={control}
            name="csv"
            label="Table of parts"
            hint="One part a line, with a heading line: ref, kind, from, to, value, rating, and so on."
            lines={7}
            isCode
            isRequired
          />
          <FileButton accept=".csv,text/csv,text/plain" onRead={(text) => onFile('csv', text)}>
            Choose a CSV file
          </FileButton>
          <TextField
            control={control}
            name="reference"
            label="Reference node"
            hint="Readings are taken against this node unless they say otherwise."
            isRequired
          />
          <div className={styles.line}>
            <TextField
              control={control}
              name="hot"
              label="Line, hot node"
              hint="Leave it empty for a circuit without power."
            />
            <TextField control={control} name="return" label="Line, return node" />
            <TextField control={control} name="designVolts" label="Design voltage" />
            <TextField control={control} name="hertz" label="Frequency" />
          </div>
        </>
      )}
    </div>
  );
}
