import { formatQuantity } from '@engine/units';
import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { StatusBadge } from '@/components/StatusBadge';
import { type PartFact } from '@/lib/api-model';
import { remarksOf } from './PartsTable';

const useStyles = makeStyles({
  list: {
    margin: 0,
    padding: 0,
    listStyle: 'none',
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    borderRadius: tokens.borderRadiusLarge,
  },
  item: {
    display: 'flex',
    flexDirection: 'column',
    gap: tokens.spacingVerticalXS,
    padding: tokens.spacingHorizontalL,
    ':not(:last-child)': { borderBottom: `1px solid ${tokens.colorNeutralStroke3}` },
  },
  top: {
    display: 'flex',
    justifyContent: 'space-between',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
  },
  quiet: { color: tokens.colorNeutralForeground3 },
});

interface PartsCardsProps {
  caption: string;
  items: readonly PartFact[];
}

/** The same ratings one below the other, for narrow screens. */
export function PartsCards({ caption, items }: PartsCardsProps) {
  const styles = useStyles();
  return (
    <ul className={styles.list} aria-label={caption}>
      {items.map((item, index) => (
        <li key={`${item.type} ${index}`} className={styles.item}>
          <span className={styles.top}>
            <Text className="tabular">
              <strong>{item.type}</strong> · {formatQuantity(item.volts, 'V', 3)} ·{' '}
              {formatQuantity(item.amps, 'A', 3)}
            </Text>
            <StatusBadge tone={item.status.startsWith('from memory') ? 'warn' : 'calm'}>
              {item.status}
            </StatusBadge>
          </span>
          {remarksOf(item) && <Text>{remarksOf(item)}</Text>}
          <Text size={200} className={styles.quiet}>
            {item.source}
          </Text>
        </li>
      ))}
    </ul>
  );
}
