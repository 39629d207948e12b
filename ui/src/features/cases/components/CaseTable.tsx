import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { StatusBadge } from '@/components/StatusBadge';
import { useTableStyles } from '@/components/table-styles';
import { type CaseSummary } from '@/lib/api-model';
import { dayInWords, stateInWords } from '@/lib/words';
import { caseNumber } from '../words/case-number';

const useStyles = makeStyles({
  complaint: { color: tokens.colorNeutralForeground2, maxWidth: '52ch' },
});

interface CaseTableProps {
  cases: readonly CaseSummary[];
  /** Address of a case. */
  linkTo: (id: number) => string;
}

/** Cases as a table, for screens with room; the same cases stand as cards where there is none. */
export function CaseTable({ cases, linkTo }: CaseTableProps) {
  const table = useTableStyles();
  const styles = useStyles();
  return (
    <div className={table.frame}>
      <table className={table.table}>
        <caption className={table.caption}>Cases</caption>
        <thead>
          <tr>
            {['Case', 'Set', 'Complaint', 'Family', 'With', 'Opened', 'State'].map((title) => (
              <th key={title} scope="col" className={table.head}>
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {cases.map((one) => (
            <tr key={one.id} className={table.row}>
              <td className={table.plain}>{caseNumber(one)}</td>
              <th scope="row" className={table.cell}>
                <Link to={linkTo(one.id)} className={table.link}>
                  {one.set}
                </Link>
              </th>
              <td className={table.cell}>
                <Text className={styles.complaint}>{one.complaint}</Text>
              </td>
              <td className={table.cell}>{one.familyName ?? 'None'}</td>
              <td className={table.cell}>{(one.assignedTo ?? one.openedBy)?.name ?? ''}</td>
              <td className={table.quiet}>{dayInWords(one.openedAt)}</td>
              <td className={table.cell}>
                <CaseState state={one.state} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

/** A case's state as a badge. */
export function CaseState({ state }: { state: string }) {
  const { word, tone } = stateInWords(state);
  return <StatusBadge tone={tone}>{word}</StatusBadge>;
}
