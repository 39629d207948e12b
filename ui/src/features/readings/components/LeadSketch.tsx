import { type Netlist } from '@engine/netlist/types';
import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { labelForNode, type Place } from '@/lib/bench/places';

interface LeadSketchProps {
  netlist: Netlist;
  place: Place;
}

const useStyles = makeStyles({
  root: {
    display: 'grid',
    gridTemplateColumns: '1fr 1fr',
    gap: tokens.spacingHorizontalM,
    margin: 0,
    padding: 0,
    listStyleType: 'none',
  },
  lead: { display: 'flex', alignItems: 'center', gap: tokens.spacingHorizontalS, minWidth: 0 },
  svg: { flexShrink: 0, overflow: 'visible' },
  red: { color: tokens.colorPaletteRedForeground1 },
  black: { color: tokens.colorNeutralForeground1 },
  tip: { stroke: tokens.colorNeutralForeground3 },
  term: {
    display: 'block',
    fontSize: tokens.fontSizeBase200,
    color: tokens.colorNeutralForeground3,
  },
  where: { display: 'block', fontWeight: tokens.fontWeightSemibold, overflowWrap: 'anywhere' },
  series: { margin: 0, color: tokens.colorNeutralForeground2 },
});

/** Where the two leads go, as a small drawing of the probes. */
export function LeadSketch({ netlist, place }: LeadSketchProps) {
  const styles = useStyles();
  const leads = leadsOf(netlist, place);
  if (place.take === 'sign' || !leads) return null;
  return (
    <>
      {place.take === 'amps' && (
        <p className={styles.series}>
          Open the circuit at {place.part} and put the meter in series.
        </p>
      )}
      {place.take === 'lifted-ohms' && (
        <p className={styles.series}>Lift one end of {place.part} first, then measure across it.</p>
      )}
      <ul className={styles.root} aria-label="Leads">
        {(['red', 'black'] as const).map((colour, index) => (
          <li key={colour} className={styles.lead}>
            <svg
              className={mergeClasses(styles.svg, styles[colour])}
              width={30}
              height={44}
              aria-hidden
            >
              <path d="M15 0C15 5 8 6 8 12" fill="none" stroke="currentColor" strokeWidth={3} />
              <path d="M4 12H12L11 32H5Z" fill="currentColor" />
              <path d="M8 32V43" className={styles.tip} strokeWidth={2} />
            </svg>
            <span>
              <span className={styles.term}>{colour === 'red' ? 'Red lead' : 'Black lead'}</span>
              <span className={styles.where}>{leads[index]}</span>
            </span>
          </li>
        ))}
      </ul>
    </>
  );
}

function leadsOf(netlist: Netlist, place: Place): [string, string] | null {
  if (place.at) return [labelForNode(netlist, place.at[0]), labelForNode(netlist, place.at[1])];
  const part = netlist.parts.find(({ ref }) => ref === place.part);
  if (!part) return null;
  return [sideOf(netlist, part.ref, part.between[0]), sideOf(netlist, part.ref, part.between[1])];
}

function sideOf(netlist: Netlist, ref: string, node: string): string {
  return `${ref}, the end at ${labelForNode(netlist, node)}`;
}
