import { type Netlist } from '@engine/netlist/types';
import { formatQuantity } from '@engine/units';
import { makeStyles, mergeClasses, Text, tokens } from '@fluentui/react-components';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { type CaseReading } from '@/lib/bench/case-reading';
import { labelForNode } from '@/lib/bench/places';
import { useWorking } from '../api/get-working';
import { ClosedFormForm } from './ClosedFormForm';
import { MathLine } from './MathLine';
import { agreementInWords } from '../words/agreement-words';

export interface WorkingPanelProps {
  caseId: string;
  netlist: Netlist;
  readings: readonly CaseReading[];
  caseVersion?: number;
  /** Part chosen at first for the closed form. */
  part?: string;
}

const useStyles = makeStyles({
  root: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL, minWidth: 0 },
  sheet: {
    padding: tokens.spacingHorizontalL,
    borderRadius: tokens.borderRadiusLarge,
    border: `1px solid ${tokens.colorNeutralStroke2}`,
    backgroundColor: tokens.colorNeutralBackground1,
    '@media (max-width: 640px)': { padding: tokens.spacingHorizontalM },
  },
  heading: {
    margin: `0 0 ${tokens.spacingVerticalS}`,
    fontSize: tokens.fontSizeBase400,
    lineHeight: tokens.lineHeightBase400,
    fontWeight: tokens.fontWeightSemibold,
  },
  intro: { margin: `0 0 ${tokens.spacingVerticalS}`, maxWidth: '70ch' },
  equations: {
    margin: 0,
    display: 'grid',
    gridTemplateColumns: 'minmax(90px, auto) auto',
    alignItems: 'center',
    justifyContent: 'start',
  },
  scroll: { overflowX: 'auto' },
  node: {
    paddingRight: tokens.spacingHorizontalM,
    color: tokens.colorNeutralForeground3,
    fontSize: tokens.fontSizeBase200,
  },
  equation: { margin: 0, minWidth: 0 },
  table: { borderCollapse: 'collapse' },
  cell: {
    padding: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalL} ${tokens.spacingVerticalXS} 0`,
    borderBottom: `1px solid ${tokens.colorNeutralStroke3}`,
    textAlign: 'left',
    fontWeight: tokens.fontWeightRegular,
  },
  value: { textAlign: 'right', fontVariantNumeric: 'tabular-nums' },
  list: { margin: 0, paddingLeft: tokens.spacingHorizontalL },
  disagree: { color: tokens.colorStatusDangerForeground1 },
});

/** Equations, solution and closed form behind the computed values. */
export function WorkingPanel({ caseId, netlist, readings, caseVersion, part }: WorkingPanelProps) {
  const styles = useStyles();
  const query = useWorking(caseId, caseVersion);
  if (query.isPending) return <LoadingState label="Setting up the equations" />;
  if (query.isError && !query.data) {
    return <FailedState error={query.error} onRetry={() => void query.refetch()} />;
  }
  const working = query.data;
  const solution = Object.entries(working.solution);
  return (
    <div className={styles.root}>
      <section className={styles.sheet} aria-label="Trace a reading to a part">
        <h3 className={styles.heading}>What would this part have to be?</h3>
        <ClosedFormForm
          key={part}
          caseId={caseId}
          netlist={netlist}
          readings={readings}
          part={part}
        />
      </section>
      <section className={styles.sheet} aria-label="Equations">
        <h3 className={styles.heading}>Equations</h3>
        <p className={styles.intro}>
          At every node the currents that come in are the currents that go out. Heaters and lamps
          stand with the resistance they have at their own current.
        </p>
        {working.equations.length === 0 ? (
          <Text>
            This circuit needs no equation: every node is tied to the line or the reference.
          </Text>
        ) : (
          <div className={styles.scroll} role="group" aria-label="All equations" tabIndex={0}>
            <dl className={styles.equations}>
              {working.equations.map(({ node, text, mathml }, index) => (
                <Equation
                  key={`${node} ${index}`}
                  node={labelForNode(netlist, node)}
                  text={text}
                  mathml={mathml}
                />
              ))}
            </dl>
          </div>
        )}
      </section>
      {solution.length > 0 && (
        <section className={styles.sheet} aria-label="Solution">
          <h3 className={styles.heading}>Solution</h3>
          <table className={styles.table} aria-label="Solution of the equations">
            <tbody>
              {solution.map(([name, value]) => (
                <tr key={name}>
                  <th scope="row" className={styles.cell}>
                    {labelForNode(netlist, name)}
                  </th>
                  <td className={mergeClasses(styles.cell, styles.value)}>
                    {formatQuantity(value, /^i[_A-Z]/.test(name) ? 'A' : 'V', 5)}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </section>
      )}
      <section className={styles.sheet} aria-label="How far to trust it">
        <h3 className={styles.heading}>How far to trust it</h3>
        <ul className={styles.list}>
          <li className={working.agreesWithSolver ? undefined : styles.disagree}>
            {agreementInWords(working)}
          </li>
          {working.notes.map((note) => (
            <li key={note}>{note}</li>
          ))}
        </ul>
      </section>
    </div>
  );
}

function Equation({ node, text, mathml }: { node: string; text: string; mathml?: string }) {
  const styles = useStyles();
  return (
    <>
      <dt className={styles.node}>{node}</dt>
      <dd className={styles.equation}>
        <MathLine text={text} mathml={mathml} />
      </dd>
    </>
  );
}
