import { type Netlist } from '@engine/netlist/types';
import { makeStyles } from '@fluentui/react-components';
import { labelForNode } from '@/lib/bench/places';
import { type NodeValues } from './schematic-model';

const useStyles = makeStyles({
  hidden: {
    position: 'absolute',
    width: '1px',
    height: '1px',
    overflow: 'hidden',
    clipPath: 'inset(50%)',
    whiteSpace: 'nowrap',
  },
});

/** The values at the nodes as a list, for those who do not see the drawing. */
export function SheetValues({
  netlist,
  values,
}: {
  netlist: Netlist;
  values: Record<string, NodeValues>;
}) {
  const styles = useStyles();
  const shown = Object.entries(values).filter(([, value]) => value.measured || value.computed);
  if (shown.length === 0) return null;
  return (
    <ul className={styles.hidden} aria-label="Values at the nodes">
      {shown.map(([node, { measured, computed }]) => (
        <li key={node}>
          {labelForNode(netlist, node)}
          {measured && `, measured ${measured}`}
          {computed && `, computed ${computed}`}
        </li>
      ))}
    </ul>
  );
}
