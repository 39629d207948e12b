import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { type CaseSummary } from '@/lib/api-model';
import { dayInWords } from '@/lib/words';
import { caseNumber } from '../words/case-number';
import { CaseState } from './CaseTable';

const useStyles = makeStyles({
  list: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalM,
    margin: 0,
    padding: 0,
    listStyle: 'none',
  },
  card: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    padding: tokens.spacingHorizontalL,
    color: tokens.colorNeutralForeground1,
    textDecoration: 'none',
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: tokens.borderRadiusLarge,
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
  },
  top: { display: 'flex', justifyContent: 'space-between', gap: tokens.spacingHorizontalM },
  quiet: { color: tokens.colorNeutralForeground3 },
});

interface CaseCardsProps {
  cases: readonly CaseSummary[];
  /** Address of a case. */
  linkTo: (id: number) => string;
}

/** Cases as cards, one below the other, for narrow screens. */
export function CaseCards({ cases, linkTo }: CaseCardsProps) {
  const styles = useStyles();
  return (
    <ul className={styles.list} aria-label="Cases">
      {cases.map((one) => (
        <li key={one.id}>
          <Link to={linkTo(one.id)} className={styles.card}>
            <span className={styles.top}>
              <Text weight="semibold" size={400}>
                {one.set}
              </Text>
              <CaseState state={one.state} />
            </span>
            <Text>{one.complaint}</Text>
            <Text size={200} className={styles.quiet}>
              {[caseNumber(one), one.familyName, (one.assignedTo ?? one.openedBy)?.name]
                .filter(Boolean)
                .join(' · ')}
              {one.openedAt && ` · opened ${dayInWords(one.openedAt)}`}
            </Text>
          </Link>
        </li>
      ))}
    </ul>
  );
}
