import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type Family } from '@/lib/api-model';
import { dayInWords, FAULT_WORDS } from '@/lib/words';

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalXXL, minWidth: 0 },
  title: {
    margin: `0 0 ${tokens.spacingVerticalS}`,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
  },
  list: { margin: 0, paddingLeft: '20px' },
  item: { marginBottom: tokens.spacingVerticalXS },
});

/** What solved cases of a family found, and how its circuit came about. */
export function FamilyFacts({ family }: { family: Family }) {
  const styles = useStyles();
  const { solved, versions } = family;
  return (
    <div className={styles.root}>
      <section aria-labelledby="solved">
        <h2 id="solved" className={styles.title}>
          Solved cases
        </h2>
        {!solved || solved.cases === 0 ? (
          <Text>
            No case of this family is solved yet. The first one that is closed with a confirmed
            fault stands here.
          </Text>
        ) : (
          <>
            <Text>
              {solved.cases === 1 ? 'One case is solved.' : `${solved.cases} cases are solved.`}
            </Text>
            <ul className={styles.list}>
              {solved.faults.map(({ part, mode, count }) => (
                <li key={`${part} ${mode}`} className={styles.item}>
                  {part} {FAULT_WORDS[mode]}, {count === 1 ? 'once' : `${count} times`}
                </li>
              ))}
            </ul>
          </>
        )}
      </section>
      <section aria-labelledby="versions">
        <h2 id="versions" className={styles.title}>
          Versions of the circuit
        </h2>
        <ol reversed className={styles.list} start={versions.length}>
          {[...versions]
            .sort((a, b) => b.version - a.version)
            .map(({ version, by, at, note }) => (
              <li key={version} value={version} className={styles.item}>
                {note || 'No note.'} {[by, dayInWords(at)].filter(Boolean).join(', ')}
              </li>
            ))}
        </ol>
      </section>
    </div>
  );
}
