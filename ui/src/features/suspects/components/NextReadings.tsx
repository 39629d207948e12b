import { type NextReading } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { useState } from 'react';
import { effortInWords, nextInWords, whyInWords } from '@/lib/bench/next-words';
import { type Place, placeOf } from '@/lib/bench/places';

interface NextReadingsProps {
  netlist: Netlist;
  nextReadings: readonly NextReading[];
  onEnterReading?: (place: Place) => void;
}

const useStyles = makeStyles({
  list: { margin: 0, padding: 0, listStyleType: 'none' },
  item: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
    padding: `${tokens.spacingVerticalS} 0`,
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
  },
  words: { flexGrow: 1, flexBasis: '220px' },
  label: { display: 'block', fontWeight: tokens.fontWeightSemibold },
  why: { display: 'block' },
  effort: { display: 'block', color: tokens.colorNeutralForeground3 },
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
});

/** Readings shown before the rest is asked for. */
const SHOWN = 6;

/** Readings worth taking, best for their time first. */
export function NextReadings({ netlist, nextReadings, onEnterReading }: NextReadingsProps) {
  const styles = useStyles();
  const [hasAll, setHasAll] = useState(false);
  if (nextReadings.length === 0) {
    return <Text>No further reading would tell the suspects apart.</Text>;
  }
  const more = nextReadings.length - SHOWN;
  return (
    <>
      <ol className={styles.list}>
        {nextReadings.slice(0, hasAll ? undefined : SHOWN).map((next) => {
          const label = nextInWords(netlist, next);
          const capital = label[0].toUpperCase() + label.slice(1);
          return (
            <li key={label} className={styles.item}>
              <div className={styles.words}>
                <Text className={styles.label}>{capital}</Text>
                <Text size={200} className={styles.why}>
                  {whyInWords(next)}
                </Text>
                <Text size={200} className={styles.effort}>
                  {effortInWords(next)}
                </Text>
              </div>
              {onEnterReading && (
                <Button
                  size="small"
                  className={styles.button}
                  aria-label={`Enter this reading: ${label}`}
                  onClick={() => onEnterReading(placeOf(next))}
                >
                  Enter this reading
                </Button>
              )}
            </li>
          );
        })}
      </ol>
      {more > 0 && (
        <Button
          appearance="subtle"
          className={styles.button}
          aria-expanded={hasAll}
          onClick={() => setHasAll(!hasAll)}
        >
          {hasAll ? 'Only the best ones' : `Show ${more} more`}
        </Button>
      )}
    </>
  );
}
