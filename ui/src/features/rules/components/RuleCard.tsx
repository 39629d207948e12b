import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { StatusBadge } from '@/components/StatusBadge';
import { type RuleSummary } from '@/lib/api-model';
import { atMost, extraTokens } from '@/theme/extra-tokens';

const useStyles = makeStyles({
  card: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalS,
    padding: tokens.spacingHorizontalL,
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: tokens.borderRadiusLarge,
  },
  top: {
    display: 'flex',
    flexWrap: 'wrap',
    justifyContent: 'space-between',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
  },
  effects: { display: 'flex', flexWrap: 'wrap', gap: tokens.spacingHorizontalXS },
  name: { margin: 0, fontSize: tokens.fontSizeBase400, lineHeight: tokens.lineHeightBase400 },
  link: {
    color: tokens.colorBrandForegroundLink,
    textDecoration: 'none',
    ':hover': { textDecoration: 'underline' },
    // A thumb needs more height than a line of text has.
    [atMost.phone]: {
      display: 'inline-flex',
      alignItems: 'center',
      minHeight: extraTokens.touchHeight,
    },
  },
  sentence: { maxWidth: '68ch' },
  quiet: { color: tokens.colorNeutralForeground3, maxWidth: '68ch' },
});

interface RuleCardProps {
  rule: RuleSummary;
  /** Address of the rule in full. */
  to: string;
}

/** One rule: what it says, why, and who says so. */
export function RuleCard({ rule, to }: RuleCardProps) {
  const styles = useStyles();
  return (
    <li className={styles.card}>
      <div className={styles.top}>
        <h3 className={styles.name}>
          <Link to={to} className={styles.link}>
            {rule.name}
          </Link>
        </h3>
        <span className={styles.effects}>
          {rule.effects.map((effect) => (
            <StatusBadge key={effect} tone={effect === 'caution' ? 'warn' : 'calm'}>
              {effect.replaceAll('-', ' ')}
            </StatusBadge>
          ))}
        </span>
      </div>
      <Text className={styles.sentence}>{rule.sentence}</Text>
      <Text className={styles.sentence}>
        <strong>Because:</strong> {rule.because}
      </Text>
      <Text size={200} className={styles.quiet}>
        {rule.source
          ? `Source: ${rule.source.title} (${rule.source.status}).`
          : 'No source is given.'}{' '}
        Version {rule.version}
        {rule.state === 'active' ? '.' : `, ${rule.state}.`}
      </Text>
    </li>
  );
}
