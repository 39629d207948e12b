import { type DiagnosisResult } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { useState } from 'react';
import { type CaseReading } from '@/lib/bench/case-reading';
import { chanceInWords } from '@/lib/bench/chance';
import { nextInWords } from '@/lib/bench/next-words';
import { groupsOf, separatorsOf, SHOWN_FROM } from '../words/suspect-words';
import { SuspectCard } from './SuspectCard';

interface SuspectGroupsProps {
  result: DiagnosisResult;
  readings: readonly (CaseReading | undefined)[];
  netlist: Netlist;
  onSelectPart?: (ref: string) => void;
  onShowWorking?: (part: string) => void;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalM },
  bracket: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    paddingLeft: tokens.spacingHorizontalM,
    borderLeft: `3px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: tokens.borderRadiusSmall,
  },
  button: { alignSelf: 'flex-start', '@media (pointer: coarse)': { minHeight: '44px' } },
});

/** Ranked suspects; those that cannot be told apart yet stand in one bracket. */
export function SuspectGroups(props: SuspectGroupsProps) {
  const { result, netlist } = props;
  const styles = useStyles();
  const [hasAll, setHasAll] = useState(false);
  const likely = result.suspects.filter(
    (suspect, index) => index < 3 || suspect.probability >= SHOWN_FROM,
  );
  const shown = hasAll ? result.suspects : likely;
  const hidden = result.suspects.length - likely.length;

  return (
    <div className={styles.root}>
      {groupsOf(shown).map((group, groupIndex) => {
        const cards = group.suspects.map((suspect, index) => (
          <SuspectCard
            key={suspect.title}
            suspect={suspect}
            readings={props.readings}
            netlist={netlist}
            isOpenAtFirst={groupIndex === 0 && index === 0}
            hasReason={index === 0}
            onSelectPart={props.onSelectPart}
            onShowWorking={props.onShowWorking}
          />
        ));
        if (cards.length === 1) return cards[0];
        const separators = separatorsOf(group, result.nextReadings);
        return (
          <section
            key={group.group}
            className={styles.bracket}
            aria-label="Suspects that cannot be told apart yet"
          >
            <Text size={200}>
              These {cards.length} cannot be told apart yet; together{' '}
              {chanceInWords(group.probability)}.
              {separators.length > 0 &&
                ` What would separate them: ${separators
                  .map((next) => nextInWords(netlist, next))
                  .join('; or ')}.`}
            </Text>
            {cards}
          </section>
        );
      })}
      {hidden > 0 && (
        <Button
          appearance="subtle"
          className={styles.button}
          aria-expanded={hasAll}
          onClick={() => setHasAll(!hasAll)}
        >
          {hasAll ? 'Only the likely ones' : `Show ${hidden} more that are hardly likely`}
        </Button>
      )}
    </div>
  );
}
