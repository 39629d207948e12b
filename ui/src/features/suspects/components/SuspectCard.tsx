import { type Suspect } from '@engine/diagnosis-types';
import { type Netlist } from '@engine/netlist/types';
import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { ChevronDownRegular, ChevronRightRegular } from '@fluentui/react-icons';
import { useId, useState } from 'react';
import { type CaseReading } from '@/lib/bench/case-reading';
import { chanceInWords } from '@/lib/bench/chance';
import { neededValueInWords, ruleEffectInWords } from '../words/suspect-words';
import { ChanceBar } from './ChanceBar';
import { EvidenceTable } from './EvidenceTable';

interface SuspectCardProps {
  suspect: Suspect;
  readings: readonly (CaseReading | undefined)[];
  netlist: Netlist;
  isOpenAtFirst: boolean;
  /** False leaves the reason out until the card is opened: it stands on the card above already. */
  hasReason: boolean;
  onSelectPart?: (ref: string) => void;
  onShowWorking?: (part: string) => void;
}

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    padding: tokens.spacingHorizontalM,
    borderRadius: tokens.borderRadiusLarge,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
  },
  top: { display: 'flex', flexWrap: 'wrap', columnGap: tokens.spacingHorizontalM },
  title: {
    flexGrow: 1,
    margin: 0,
    fontSize: tokens.fontSizeBase400,
    lineHeight: tokens.lineHeightBase400,
    fontWeight: tokens.fontWeightSemibold,
  },
  chance: { fontVariantNumeric: 'tabular-nums', color: tokens.colorNeutralForeground2 },
  list: { margin: 0, paddingLeft: tokens.spacingHorizontalL },
  reasons: { margin: 0 },
  more: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalM },
  heading: {
    display: 'block',
    marginBottom: tokens.spacingVerticalXXS,
    color: tokens.colorNeutralForeground3,
  },
  actions: { display: 'flex', flexWrap: 'wrap', gap: tokens.spacingHorizontalS },
  button: {
    paddingLeft: tokens.spacingHorizontalS,
    '@media (pointer: coarse)': { minHeight: '44px' },
  },
});

/** One suspect: what, how likely, why, and on demand the whole evidence. */
export function SuspectCard(props: SuspectCardProps) {
  const { suspect, readings, netlist } = props;
  const styles = useStyles();
  const [isOpen, setIsOpen] = useState(props.isOpenAtFirst);
  const id = useId();
  const needed = suspect.faults.flatMap((fault) => {
    const words = neededValueInWords(fault);
    return words ? [{ part: fault.part, words }] : [];
  });
  const parts = [...new Set(suspect.faults.map(({ part }) => part))];
  const hasMore =
    suspect.evidence.length > 0 ||
    suspect.rules.length > 0 ||
    suspect.reasons.length > 1 ||
    !!suspect.cause ||
    parts.length > 0;

  return (
    <article className={styles.root} aria-labelledby={`${id}-title`}>
      <div className={styles.top}>
        <h4 className={styles.title} id={`${id}-title`}>
          {suspect.title}
        </h4>
        <Text className={styles.chance}>{chanceInWords(suspect.probability)}</Text>
      </div>
      <ChanceBar probability={suspect.probability} />
      {(isOpen || props.hasReason ? suspect.reasons : [])
        .slice(0, isOpen ? undefined : 1)
        .map((reason) => (
          <p key={reason} className={styles.reasons}>
            {reason}
          </p>
        ))}
      {needed.map(({ part, words }) => (
        <p key={`${part} ${words}`} className={styles.reasons}>
          To explain the readings, {part} would need {words}.
        </p>
      ))}
      <div className={styles.actions}>
        {hasMore && (
          <Button
            size="small"
            appearance="subtle"
            className={styles.button}
            icon={isOpen ? <ChevronDownRegular /> : <ChevronRightRegular />}
            aria-label={`${isOpen ? 'Less' : 'Why'} about ${suspect.title}`}
            aria-expanded={isOpen}
            aria-controls={`${id}-more`}
            onClick={() => setIsOpen(!isOpen)}
          >
            {isOpen ? 'Less' : 'Why'}
          </Button>
        )}
        {isOpen &&
          props.onSelectPart &&
          parts.map((part) => (
            <Button
              key={part}
              size="small"
              appearance="subtle"
              className={styles.button}
              onClick={() => props.onSelectPart?.(part)}
            >
              Show {part}
            </Button>
          ))}
        {isOpen &&
          props.onShowWorking &&
          parts.map((part) => (
            <Button
              key={part}
              size="small"
              appearance="subtle"
              className={styles.button}
              onClick={() => props.onShowWorking?.(part)}
            >
              Working for {part}
            </Button>
          ))}
      </div>
      {hasMore && isOpen && (
        <div className={styles.more} id={`${id}-more`}>
          {suspect.cause && (
            <div>
              <Text size={200} className={styles.heading}>
                One cause for all
              </Text>
              <Text>
                {suspect.cause.name}. {suspect.cause.because}
              </Text>
            </div>
          )}
          <EvidenceTable suspect={suspect} readings={readings} netlist={netlist} />
          {suspect.rules.length > 0 && (
            <div>
              <Text size={200} className={styles.heading}>
                Rules that had their say
              </Text>
              <ul className={styles.list}>
                {suspect.rules.map((voice) => (
                  <li key={voice.rule}>
                    {voice.because} This {ruleEffectInWords(voice)}.
                  </li>
                ))}
              </ul>
            </div>
          )}
        </div>
      )}
    </article>
  );
}
