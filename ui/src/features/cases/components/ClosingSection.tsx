import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { FormMessage } from '@/components/FormMessage';
import { type Case } from '@/lib/api-model';
import { problemInWords } from '@/lib/bench/problem';
import { dayInWords, FAULT_WORDS, OUTCOME_WORDS } from '@/lib/words';
import { useReopenCase } from '../api/reopen-case';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-start',
    gap: tokens.spacingVerticalM,
  },
  title: { margin: 0, fontSize: tokens.fontSizeBase500, lineHeight: tokens.lineHeightBase500 },
  list: { margin: 0, paddingLeft: '20px' },
});

interface ClosingSectionProps {
  repair: Case;
  onCloseCase: () => void;
}

/** How a case is closed, how it ended, or why this person cannot close it. */
export function ClosingSection({ repair, onCloseCase }: ClosingSectionProps) {
  const styles = useStyles();
  const reopen = useReopenCase(String(repair.id));
  const { abilities, confirmedFaults, closedAt, outcome, closingNote } = repair;
  const isClosed = repair.state === 'closed';
  return (
    <section className={styles.root} aria-labelledby="closing">
      <h2 id="closing" className={styles.title}>
        Closing
      </h2>
      {isClosed ? (
        <>
          <Text>
            {outcome ? `${OUTCOME_WORDS[outcome]}.` : 'This case is closed.'}
            {closedAt && ` Closed ${dayInWords(closedAt)}.`}
          </Text>
          {confirmedFaults.length > 0 && (
            <ul className={styles.list} aria-label="Confirmed faults">
              {confirmedFaults.map(({ part, mode }) => (
                <li key={`${part} ${mode}`}>
                  {part} {FAULT_WORDS[mode]}
                </li>
              ))}
            </ul>
          )}
          {closingNote && <Text>{closingNote}</Text>}
          <FormMessage message={reopen.isError ? problemInWords(reopen.error) : undefined} />
          {abilities.reopen && (
            <Button size="large" disabled={reopen.isPending} onClick={() => reopen.mutate()}>
              Open it again
            </Button>
          )}
        </>
      ) : abilities.close ? (
        <>
          <Text>Close the case once the faults are confirmed and the set has proved itself.</Text>
          <Button size="large" onClick={onCloseCase}>
            Close the case…
          </Button>
        </>
      ) : (
        <Text>
          A trainee cannot close a case. Ask a technician to look at the readings and close it with
          you.
        </Text>
      )}
    </section>
  );
}
