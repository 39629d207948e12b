import { Button, makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { BackspaceRegular } from '@fluentui/react-icons';
import { type Take } from '@engine/netlist/types';
import { TAKE_WORDS } from '@/lib/bench/takes';

interface NumberPadProps {
  take: Take;
  text: string;
  onText: (text: string) => void;
  onEnter: () => void;
}

const useStyles = makeStyles({
  root: {
    display: 'grid',
    gridTemplateColumns: 'repeat(4, 1fr)',
    gap: tokens.spacingHorizontalS,
  },
  key: {
    minWidth: 0,
    maxWidth: 'none',
    minHeight: '48px',
    fontSize: tokens.fontSizeBase500,
    fontVariantNumeric: 'tabular-nums',
  },
  side: { fontSize: tokens.fontSizeBase400 },
  enter: { gridColumnEnd: 'span 4', minHeight: '52px' },
});

const DIGITS = ['7', '8', '9', '4', '5', '6', '1', '2', '3'];

/** Keys beside the digits: the factors that a meter shows for this kind of reading. */
function sideKeys(take: Take): string[] {
  const { unit } = TAKE_WORDS[take];
  if (unit === 'Ω') return ['k', 'M', 'OL'];
  if (unit === 'A') return ['m', 'µ', '−'];
  return take === 'dc-volts' ? ['−', 'm', 'k'] : ['m', 'k'];
}

/**
 * Changes a value as a key of the pad does.
 *
 * @param text what stands there.
 * @param key digit, `.`, a factor, `−` or `OL`.
 * @returns the new text; a factor replaces another, `OL` replaces all, `−` turns the sign.
 */
export function pressKey(text: string, key: string): string {
  if (key === 'OL') return 'OL';
  const number = text === 'OL' ? '' : text.replace(/[^\d.,\-−]/g, '');
  if (key === '−') return number.startsWith('-') ? number.slice(1) : `-${number}`;
  if (/^[kMmµ]$/.test(key)) return number === '' ? '' : `${number}${key}`;
  if (key === '.' && number.includes('.')) return text;
  const factor = /[kMmµ]$/.exec(text)?.[0];
  // Digits after a factor start a new value: 4.7k is done.
  return factor ? key : `${number}${key}`;
}

/** Large keys for one value, for a thumb while the other hand holds a lead. */
export function NumberPad({ take, text, onText, onEnter }: NumberPadProps) {
  const styles = useStyles();
  const sides = sideKeys(take);
  const key = (label: string, isSide = false) => (
    <Button
      key={label}
      className={mergeClasses(styles.key, isSide && styles.side)}
      onClick={() => onText(pressKey(text, label))}
    >
      {label}
    </Button>
  );
  const rows = [0, 1, 2].map((row) => [
    ...DIGITS.slice(row * 3, row * 3 + 3).map((digit) => key(digit)),
    sides[row] ? key(sides[row], true) : <span key={`blank ${row}`} />,
  ]);
  return (
    <div className={styles.root} role="group" aria-label="Number pad">
      {rows}
      {key('.')}
      {key('0')}
      <Button
        className={styles.key}
        icon={<BackspaceRegular />}
        aria-label="Delete the last digit"
        onClick={() => onText(text === 'OL' ? '' : text.slice(0, -1))}
      />
      <Button className={mergeClasses(styles.key, styles.side)} onClick={() => onText('')}>
        Clear
      </Button>
      <Button
        appearance="primary"
        className={mergeClasses(styles.key, styles.enter)}
        onClick={onEnter}
      >
        Enter
      </Button>
    </div>
  );
}
