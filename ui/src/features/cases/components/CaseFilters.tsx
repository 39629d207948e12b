import { Checkbox, Field, makeStyles, SearchBox, Select, tokens } from '@fluentui/react-components';
import { OPEN_STATES, stateInWords } from '@/lib/words';
import { type CaseFilter } from '../api/get-cases';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'flex-end',
    gap: tokens.spacingHorizontalL,
    marginBottom: tokens.spacingVerticalL,
  },
  search: { flexGrow: 1, maxWidth: '420px', minWidth: 'min(100%, 240px)' },
  box: { width: '100%', maxWidth: 'none' },
});

interface CaseFiltersProps {
  filter: CaseFilter;
  onChange: (event: React.SyntheticEvent, filter: CaseFilter) => void;
}

/** Which cases the bench shows. */
export function CaseFilters({ filter, onChange }: CaseFiltersProps) {
  const styles = useStyles();
  return (
    <div className={styles.root} role="search" aria-label="Cases">
      <Field label="Search" className={styles.search}>
        <SearchBox
          className={styles.box}
          size="large"
          value={filter.search}
          placeholder="Number, set or complaint"
          onChange={(event, { value }) => onChange(event, { ...filter, search: value })}
        />
      </Field>
      <Field label="State">
        <Select
          size="large"
          value={filter.state}
          onChange={(event, { value }) => onChange(event, { ...filter, state: value })}
        >
          <option value="open">Open cases</option>
          {OPEN_STATES.map((state) => (
            <option key={state} value={state}>
              {stateInWords(state).word}
            </option>
          ))}
          <option value="closed">Closed cases</option>
          <option value="all">All cases</option>
        </Select>
      </Field>
      <Checkbox
        size="large"
        label="Only mine"
        checked={filter.isMine}
        onChange={(event, { checked }) => onChange(event, { ...filter, isMine: checked === true })}
      />
    </div>
  );
}
