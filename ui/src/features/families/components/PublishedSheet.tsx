import { makeStyles, Text, tokens } from '@fluentui/react-components';
import { type Netlist, type Point } from '@engine/netlist/types';
import { formatQuantity } from '@engine/units';
import { useTableStyles } from '@/components/table-styles';

const useStyles = makeStyles({
  title: {
    margin: `0 0 ${tokens.spacingVerticalS}`,
    fontSize: tokens.fontSizeBase500,
    lineHeight: tokens.lineHeightBase500,
  },
  note: { display: 'block', marginTop: tokens.spacingVerticalS },
});

/** What the service literature prints at the points of a circuit. */
export function PublishedSheet({ netlist }: { netlist: Netlist }) {
  const styles = useStyles();
  const table = useTableStyles();
  const points = (netlist.points ?? []).filter(({ published }) => valuesOf(published).length > 0);
  return (
    <section aria-labelledby="published">
      <h2 id="published" className={styles.title}>
        Published values
      </h2>
      {points.length === 0 ? (
        <Text>No published values are recorded for this circuit.</Text>
      ) : (
        <>
          <div className={table.frame}>
            <table className={table.table} aria-labelledby="published">
              <thead>
                <tr>
                  <th scope="col" className={table.head}>
                    Point
                  </th>
                  <th scope="col" className={table.head}>
                    Value
                  </th>
                </tr>
              </thead>
              <tbody>
                {points.map(({ node, label, published }) => (
                  <tr key={node} className={table.row}>
                    <th scope="row" className={table.cell}>
                      {label ?? node}
                    </th>
                    <td className={table.cell}>{valuesOf(published).join(', ')}</td>
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
          <Text size={200} className={styles.note}>
            Measured against {netlist.reference} unless the sheet says otherwise.
          </Text>
        </>
      )}
    </section>
  );
}

function valuesOf(published: Point['published']): string[] {
  const { acVolts, dcVolts, ohms } = published ?? {};
  return [
    acVolts !== undefined && `${formatQuantity(acVolts, 'V', 4)} AC`,
    dcVolts !== undefined && `${formatQuantity(dcVolts, 'V', 4)} DC`,
    ohms !== undefined && formatQuantity(ohms, 'Ω', 4),
  ].filter((value) => value !== false);
}
