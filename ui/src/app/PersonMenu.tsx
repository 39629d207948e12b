import { Button, Field, makeStyles, Select, Text, tokens } from '@fluentui/react-components';
import { useId } from 'react';
import { type Person } from '@/lib/api-model';
import { useSessionActions } from '@/lib/session';
import { ROLE_WORDS } from '@/lib/words';
import { extraTokens } from '@/theme/extra-tokens';
import { type ThemeChoice, useThemeChoice } from './theme-choice';

const useStyles = makeStyles({
  sheet: {
    position: 'fixed',
    inset: 'unset',
    top: '60px',
    right: 'clamp(12px, 2.5vw, 36px)',
    width: 'min(300px, calc(100vw - 24px))',
    margin: 0,
    padding: tokens.spacingHorizontalL,
    color: tokens.colorNeutralForeground1,
    backgroundColor: tokens.colorNeutralBackground1,
    border: `1px solid ${tokens.colorNeutralStroke1}`,
    borderRadius: tokens.borderRadiusLarge,
    boxShadow: tokens.shadow16,
  },
  rows: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
  quiet: { color: tokens.colorNeutralForeground3, overflowWrap: 'anywhere' },
  name: {
    minHeight: extraTokens.touchHeight,
    maxWidth: '60vw',
    padding: `0 ${tokens.spacingHorizontalM}`,
    color: tokens.colorNeutralForeground2,
    fontFamily: 'inherit',
    fontSize: tokens.fontSizeBase300,
    fontWeight: tokens.fontWeightSemibold,
    backgroundColor: 'transparent',
    border: 'none',
    borderRadius: tokens.borderRadiusMedium,
    cursor: 'pointer',
    ':hover': { backgroundColor: tokens.colorSubtleBackgroundHover },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}` },
  },
});

interface PersonMenuProps {
  person: Person;
  className?: string;
}

/**
 * Who is signed in, how bright the page is, and the way out.
 *
 * The browser's own popover opens it: it stands on every page, and a menu of the library would weigh as much as
 * the bench itself.
 */
export function PersonMenu({ person, className }: PersonMenuProps) {
  const styles = useStyles();
  const id = useId();
  const { choice, choose } = useThemeChoice();
  const { leave } = useSessionActions();
  return (
    <div className={className}>
      <button type="button" className={styles.name} popoverTarget={id} aria-haspopup="dialog">
        {person.name}
      </button>
      <div id={id} popover="auto" role="dialog" aria-label="Your account" className={styles.sheet}>
        <div className={styles.rows}>
          <Text className={styles.quiet}>
            {person.email}
            <br />
            {ROLE_WORDS[person.role]}
          </Text>
          <Field label="Look of the page">
            <Select
              size="large"
              value={choice}
              onChange={(_event, { value }) => choose(value as ThemeChoice)}
            >
              <option value="system">As this device is set</option>
              <option value="light">Daylight</option>
              <option value="dark">Dim bench</option>
            </Select>
          </Field>
          <Button size="large" onClick={() => void leave()}>
            Sign out
          </Button>
        </div>
      </div>
    </div>
  );
}
