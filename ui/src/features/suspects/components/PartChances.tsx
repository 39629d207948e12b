import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { chanceInWords } from '@/lib/bench/chance';
import { ChanceBar } from './ChanceBar';

interface PartChancesProps {
  parts: readonly { part: string; probability: number }[];
  onSelectPart?: (ref: string) => void;
}

const useStyles = makeStyles({
  list: { margin: 0, padding: 0, listStyleType: 'none' },
  item: {
    display: 'grid',
    gridTemplateColumns: 'minmax(64px, auto) 1fr minmax(110px, auto)',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
    minHeight: '34px',
    '@media (pointer: coarse)': { minHeight: '44px' },
  },
  button: { justifyContent: 'flex-start', paddingLeft: 0, minWidth: 0 },
  chance: { textAlign: 'right', color: tokens.colorNeutralForeground2 },
});

/** Fewest and most parts shown. */
const FEWEST = 3;
const MOST = 10;

/** How likely each part is bad, whatever else is. */
export function PartChances({ parts, onSelectPart }: PartChancesProps) {
  const styles = useStyles();
  const shown = parts
    .slice(0, MOST)
    .filter((one, index) => index < FEWEST || one.probability >= 0.01);
  return (
    <ul className={styles.list}>
      {shown.map(({ part, probability }) => (
        <li key={part} className={styles.item}>
          {onSelectPart ? (
            <Button
              appearance="transparent"
              size="small"
              className={styles.button}
              aria-label={`Show ${part} in the circuit`}
              onClick={() => onSelectPart(part)}
            >
              {part}
            </Button>
          ) : (
            <Text weight="semibold">{part}</Text>
          )}
          <ChanceBar probability={probability} />
          <Text size={200} className={styles.chance}>
            {chanceInWords(probability)}
          </Text>
        </li>
      ))}
    </ul>
  );
}
