import { type NextReading } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { ArrowRightRegular } from '@fluentui/react-icons';
import { nextInWords, whyInWords } from '@/lib/bench/next-words';

interface NextReadingNoteProps {
  netlist: Netlist;
  next: NextReading;
  onGo: () => void;
}

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    columnGap: tokens.spacingHorizontalM,
    rowGap: tokens.spacingVerticalXS,
    padding: `${tokens.spacingVerticalS} ${tokens.spacingHorizontalM}`,
    borderLeft: `4px solid ${tokens.colorBrandStroke1}`,
    borderRadius: tokens.borderRadiusMedium,
    backgroundColor: tokens.colorNeutralBackground2,
  },
  words: { flexGrow: 1, flexBasis: '220px' },
  why: { display: 'block', color: tokens.colorNeutralForeground2 },
  button: { '@media (pointer: coarse)': { minHeight: '44px' } },
});

/** Points out the reading that would settle most for its time. */
export function NextReadingNote({ netlist, next, onGo }: NextReadingNoteProps) {
  const styles = useStyles();
  return (
    <div className={styles.root} role="note" aria-label="Next reading">
      <div className={styles.words}>
        <Text weight="semibold">Next: {nextInWords(netlist, next)}</Text>
        <Text size={200} className={styles.why}>
          {whyInWords(next)}
        </Text>
      </div>
      <Button
        className={styles.button}
        icon={<ArrowRightRegular />}
        iconPosition="after"
        onClick={onGo}
      >
        Enter it
      </Button>
    </div>
  );
}
