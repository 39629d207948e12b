import { type NextReading } from '@engine/diagnosis-types';
import { type Netlist, type Seen } from '@engine/netlist/types';
import { Button, Select, Text } from '@fluentui/react-components';
import { ChevronLeftRegular, ChevronRightRegular } from '@fluentui/react-icons';
import { labelForReading, type Place, placeKey, placeOf } from '@/lib/bench/places';
import { takenInWords } from '@/lib/bench/quantities';
import { isPoweredReading, SEEN_WORDS, TAKE_WORDS } from '@/lib/bench/takes';
import { type GridSection, placesOf } from '../grid/grid-model';
import { type ReadingEntry } from '../hooks/useReadingEntry';
import { useBenchEntryStyles } from './BenchEntry.styles';
import { CautionNote } from './CautionNote';
import { LeadSketch } from './LeadSketch';
import { NumberPad } from './NumberPad';

interface BenchEntryProps {
  netlist: Netlist;
  sections: GridSection[];
  nextReadings: NextReading[];
  entry: ReadingEntry;
  /** Place shown; the suggested one when none was chosen. */
  place?: Place;
  isReadOnly: boolean;
  isCautionAcknowledged: boolean;
  onNeedCautions: () => void;
  onPlace: (place: Place) => void;
}

/** One reading at a time in large type, with a number pad: for use with a lead in each hand. */
export function BenchEntry(props: BenchEntryProps) {
  const { netlist, sections, nextReadings, entry, isReadOnly, onPlace } = props;
  const styles = useBenchEntryStyles();
  const groups = sections.map((section) => ({
    title: section.title,
    places: uniquePlaces(section),
  }));
  const places = groups.flatMap((group) => group.places);
  const shown = props.place ?? nextReadings[0] ?? places[0];
  if (!shown) {
    return <Text>This circuit has no place for a lead yet. Add parts to it first.</Text>;
  }
  const place = placeOf(shown);
  const key = placeKey(place);
  const index = places.findIndex((other) => placeKey(other) === key);
  const cell = entry.entryOf(place);
  const isLocked = isPoweredReading(place.take) && !props.isCautionAcknowledged;
  const saved = cell.value === undefined ? '' : takenInWords(cell.value, place.take);
  const suggested = nextReadings.find((next) => placeKey(next) === key);
  const { unit } = TAKE_WORDS[place.take];

  const goOn = () => {
    const other = nextReadings.find((next) => placeKey(next) !== key);
    const following = suggested && other ? other : places[index + 1];
    if (following) onPlace(following);
  };
  const handleEnter = () => {
    if (entry.enter(place)) goOn();
  };
  const step = (by: number) => onPlace(places[(index + by + places.length) % places.length]);

  return (
    <section className={styles.root} aria-label="One reading">
      <div className={styles.chooser}>
        <Button
          className={styles.step}
          icon={<ChevronLeftRegular />}
          aria-label="Reading before"
          onClick={() => step(-1)}
        />
        <Select
          aria-label="Reading"
          className={styles.select}
          value={key}
          onChange={(_event, { value }) => {
            const chosen = places.find((other) => placeKey(other) === value);
            if (chosen) onPlace(chosen);
          }}
        >
          {groups.map(({ title, places: own }) => (
            <optgroup key={title} label={title}>
              {own.map((other) => (
                <option key={placeKey(other)} value={placeKey(other)}>
                  {capital(labelForReading(netlist, other))}
                </option>
              ))}
            </optgroup>
          ))}
        </Select>
        <Button
          className={styles.step}
          icon={<ChevronRightRegular />}
          aria-label="Reading after"
          onClick={() => step(1)}
        />
      </div>
      <div>
        <Text size={200} className={styles.state}>
          {suggested ? 'Suggested next, ' : ''}
          {isPoweredReading(place.take) ? 'with the set powered' : 'with the power off'}
        </Text>
        <h3 className={styles.title}>{capital(labelForReading(netlist, place))}</h3>
      </div>
      <LeadSketch netlist={netlist} place={place} />
      {isLocked ? (
        <CautionNote onNeedCautions={props.onNeedCautions} />
      ) : place.take === 'sign' ? (
        <div className={styles.looks} role="group" aria-label={labelForReading(netlist, place)}>
          {(Object.keys(SEEN_WORDS) as Seen[]).map((seen) => (
            <Button
              key={seen}
              className={styles.look}
              appearance={cell.seen === seen ? 'primary' : 'secondary'}
              aria-pressed={cell.seen === seen}
              disabled={isReadOnly}
              onClick={() => {
                entry.see(place, cell.seen === seen ? undefined : seen);
                if (cell.seen !== seen) goOn();
              }}
            >
              {SEEN_WORDS[seen].word}
            </Button>
          ))}
        </div>
      ) : (
        <>
          <output className={styles.value} aria-label="Value">
            {cell.draft ?? saved}
            {cell.draft !== undefined && cell.draft !== 'OL' && (
              <span className={styles.unit}>{unit}</span>
            )}
            {cell.draft === undefined && saved === '' && (
              <span className={styles.unit}>– {unit}</span>
            )}
          </output>
          {cell.error && (
            <p role="alert" className={styles.error}>
              {cell.error}
            </p>
          )}
          {!isReadOnly && (
            <NumberPad
              take={place.take}
              text={cell.draft ?? ''}
              onText={(text) => entry.type(place, text)}
              onEnter={handleEnter}
            />
          )}
        </>
      )}
    </section>
  );
}

/** Looks stand in both sections; here once. */
function uniquePlaces(section: GridSection): Place[] {
  return placesOf(section).filter(({ take }) => take !== 'sign' || section.id === 'cold');
}

function capital(text: string): string {
  return text === '' ? text : text[0].toUpperCase() + text.slice(1);
}
