import { Field, makeStyles, Select } from '@fluentui/react-components';
import { useMeters } from '../api/get-meters';

interface MeterPickerProps {
  meterId: string | undefined;
  onChoose: (id: string | undefined) => void;
}

const useStyles = makeStyles({
  root: { minWidth: '190px' },
});

/** The meter that readings are taken with; remembered for the next case. */
export function MeterPicker({ meterId, onChoose }: MeterPickerProps) {
  const styles = useStyles();
  const meters = useMeters();
  const own = meters.data ?? [];
  const isKnown = !meterId || own.some(({ id }) => id === meterId);
  return (
    <Field
      label="Meter"
      orientation="horizontal"
      size="small"
      className={styles.root}
      validationState={meters.isError ? 'warning' : 'none'}
      validationMessage={
        meters.isError ? 'Your own meters could not be fetched; the usual one is used.' : undefined
      }
    >
      <Select
        size="small"
        value={isKnown ? (meterId ?? '') : ''}
        onChange={(_event, { value }) => onChoose(value || undefined)}
      >
        <option value="">Digital, 10 MΩ</option>
        {own.map(({ id, name }) => (
          <option key={id} value={id}>
            {name}
          </option>
        ))}
      </Select>
    </Field>
  );
}
