import { type Netlist, type Take, TAKES } from '@engine/netlist/types';
import { Button, Field, makeStyles, Select, tokens } from '@fluentui/react-components';
import { useState } from 'react';
import { labelForNode, type Place } from '@/lib/bench/places';
import { TAKE_WORDS } from '@/lib/bench/takes';

interface AddLeadsProps {
  netlist: Netlist;
  onAdd: (place: Place) => void;
}

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    gap: tokens.spacingHorizontalM,
    margin: 0,
    padding: tokens.spacingHorizontalL,
    borderRadius: tokens.borderRadiusLarge,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    '@media (max-width: 640px)': { padding: tokens.spacingHorizontalM },
  },
  field: { flexBasis: '150px', flexGrow: 1, maxWidth: '240px' },
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
});

const LEAD_TAKES = TAKES.filter((take) => !['amps', 'lifted-ohms', 'sign'].includes(take));

/** Adds a row for a reading between any two nodes. */
export function AddLeads({ netlist, onAdd }: AddLeadsProps) {
  const styles = useStyles();
  const nodes = [...new Set(netlist.parts.flatMap((part) => part.between))];
  const [take, setTake] = useState<Take>('ohms');
  const [red, setRed] = useState('');
  const [black, setBlack] = useState('');
  const [error, setError] = useState<string>();

  const add = () => {
    if (!red || !black || red === black) {
      setError('Choose two different places for the leads.');
      return;
    }
    setError(undefined);
    onAdd({ take, at: [red, black] });
  };
  const lead = (label: string, value: string, onChange: (node: string) => void) => (
    <Field label={label} size="small" className={styles.field}>
      <Select size="small" value={value} onChange={(_event, data) => onChange(data.value)}>
        <option value="">Choose a place</option>
        {nodes.map((node) => (
          <option key={node} value={node}>
            {labelForNode(netlist, node)}
          </option>
        ))}
      </Select>
    </Field>
  );

  return (
    <form
      className={styles.root}
      aria-label="Another reading"
      onSubmit={(event) => {
        event.preventDefault();
        add();
      }}
    >
      <Field
        label="Another reading"
        size="small"
        className={styles.field}
        validationMessage={error}
        validationState={error ? 'error' : 'none'}
      >
        <Select size="small" value={take} onChange={(_event, data) => setTake(data.value as Take)}>
          {LEAD_TAKES.map((one) => (
            <option key={one} value={one}>
              {TAKE_WORDS[one].title}
            </option>
          ))}
        </Select>
      </Field>
      {lead('Red lead', red, setRed)}
      {lead('Black lead', black, setBlack)}
      <Button type="submit" size="small" className={styles.button}>
        Add a row
      </Button>
    </form>
  );
}
