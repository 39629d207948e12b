import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { type FamilySummary } from '@/lib/api-model';

const useStyles = makeStyles({
  list: {
    display: 'grid',
    gridTemplateColumns: 'repeat(auto-fill, minmax(min(100%, 340px), 1fr))',
    gap: tokens.spacingHorizontalL,
    margin: 0,
    padding: 0,
    listStyle: 'none',
  },
  card: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    height: '100%',
    padding: tokens.spacingHorizontalL,
    color: tokens.colorNeutralForeground1,
    textDecoration: 'none',
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: tokens.borderRadiusLarge,
    ':hover': { backgroundColor: tokens.colorNeutralBackground1Hover },
  },
  quiet: { color: tokens.colorNeutralForeground3, marginTop: 'auto' },
});

interface FamilyCardsProps {
  families: readonly FamilySummary[];
  /** Address of a family. */
  linkTo: (id: number) => string;
}

/** Chassis families, each a link. */
export function FamilyCards({ families, linkTo }: FamilyCardsProps) {
  const styles = useStyles();
  return (
    <ul className={styles.list} aria-label="Families">
      {families.map((family) => (
        <li key={family.id}>
          <Link to={linkTo(family.id)} className={styles.card}>
            <Text weight="semibold" size={400}>
              {family.name}
            </Text>
            {family.description && <Text>{family.description}</Text>}
            <Text size={200} className={styles.quiet}>
              {factsOf(family).join(' · ')}
            </Text>
          </Link>
        </li>
      ))}
    </ul>
  );
}

function factsOf({ kind, parts, solvedCases }: FamilySummary): string[] {
  const facts = [kind.charAt(0).toUpperCase() + kind.slice(1)];
  if (parts) facts.push(`${parts} parts`);
  if (solvedCases !== undefined)
    facts.push(
      solvedCases === 0
        ? 'no solved case yet'
        : solvedCases === 1
          ? 'one solved case'
          : `${solvedCases} solved cases`,
    );
  return facts;
}
