import { Label, makeStyles, Select, Text, tokens } from '@fluentui/react-components';
import { useId } from 'react';
import { useMeters } from '../api/get-meters';

interface MeterPickerProps {
  meterId: number | undefined;
  onChoose: (id: number | undefined) => void;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: tokens.spacingHorizontalS },
  select: {
    width: '210px',
    maxWidth: '60vw',
    '@media (pointer: coarse)': { '& select': { minHeight: '44px' } },
  },
});

/** The meter that readings are taken with; remembered for the next case. */
export function MeterPicker({ meterId, onChoose }: MeterPickerProps) {
  const styles = useStyles();
  const meters = useMeters();
  const id = useId();
  const noteId = useId();
  const own = meters.data ?? [];
  const isKnown = !meterId || own.some((meter) => meter.id === meterId);
  const options = (
    <>
      <option value="">Digital, 10 MΩ</option>
      {own.map((meter) => (
        <option key={meter.id} value={meter.id}>
          {meter.name}
        </option>
      ))}
    </>
  );
  return (
    <div className={styles.root}>
      <Label htmlFor={id}>Meter</Label>
      <Select
        id={id}
        className={styles.select}
        value={isKnown ? (meterId ?? '') : ''}
        aria-describedby={meters.isError ? noteId : undefined}
        onChange={(_event, { value }) => onChoose(value ? Number(value) : undefined)}
      >
        {options}
      </Select>
      {meters.isError && (
        <Text id={noteId} size={200}>
          Your own meters could not be fetched; the usual one is used.
        </Text>
      )}
    </div>
  );
}
