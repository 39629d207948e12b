import { Button, makeStyles, Select, Text, tokens } from '@fluentui/react-components';
import { StatusBadge } from '@/components/StatusBadge';
import { type Person, type Role, ROLES } from '@/lib/api-model';
import { ROLE_WORDS } from '@/lib/words';
import { type PersonChange } from '../api/change-person';

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
    display: 'grid',
    gridTemplateColumns: '1fr',
    alignItems: 'center',
    gap: tokens.spacingHorizontalM,
    padding: tokens.spacingHorizontalL,
    ':not(:last-child)': { borderBottom: `1px solid ${tokens.colorNeutralStroke3}` },
    '@media (min-width: 760px)': { gridTemplateColumns: 'minmax(0, 1fr) 120px 210px 130px' },
  },
  words: { display: 'flex', flexDirection: 'column', minWidth: 0, overflowWrap: 'anywhere' },
  quiet: { color: tokens.colorNeutralForeground3 },
});

interface PeopleTableProps {
  people: readonly Person[];
  /** Id of the person who looks; nobody blocks themselves. */
  ownId?: number;
  isChanging: boolean;
  onChange: (event: React.SyntheticEvent, change: PersonChange) => void;
}

/** Everybody in the shop with their role; the service protects the last owner. */
export function PeopleTable({ people, ownId, isChanging, onChange }: PeopleTableProps) {
  const styles = useStyles();
  return (
    <ul className={styles.list} aria-label="People">
      {people.map((person) => {
        const { id, name, email, role, isBlocked, isInvited } = person;
        return (
          <li key={id} className={styles.item}>
            <div className={styles.words}>
              <Text weight="semibold">{name}</Text>
              <Text size={200} className={styles.quiet}>
                {email}
              </Text>
            </div>
            <div>
              {isBlocked ? (
                <StatusBadge tone="warn">Blocked</StatusBadge>
              ) : isInvited ? (
                <StatusBadge>Invited</StatusBadge>
              ) : (
                <StatusBadge tone="done">Works here</StatusBadge>
              )}
            </div>
            <Select
              size="large"
              aria-label={`Role of ${name}`}
              value={role}
              disabled={isChanging}
              onChange={(event, { value }) => onChange(event, { id, role: value as Role })}
            >
              {ROLES.map((one) => (
                <option key={one} value={one}>
                  {ROLE_WORDS[one]}
                </option>
              ))}
            </Select>
            {id === ownId ? (
              <Text className={styles.quiet}>This is you.</Text>
            ) : (
              <Button
                size="large"
                disabled={isChanging}
                aria-label={isBlocked ? `Let ${name} in again` : `Block ${name}`}
                onClick={(event) => onChange(event, { id, isBlocked: !isBlocked })}
              >
                {isBlocked ? 'Let in again' : 'Block'}
              </Button>
            )}
          </li>
        );
      })}
    </ul>
  );
}
