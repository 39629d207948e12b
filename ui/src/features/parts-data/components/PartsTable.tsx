import { formatQuantity } from '@engine/units';
import { StatusBadge } from '@/components/StatusBadge';
import { useTableStyles } from '@/components/table-styles';
import { type PartFact } from '@/lib/api-model';

interface PartsTableProps {
  caption: string;
  items: readonly PartFact[];
}

/** Ratings of tubes or lamps, each with where it comes from; for screens with room. */
export function PartsTable({ caption, items }: PartsTableProps) {
  const table = useTableStyles();
  return (
    <div className={table.frame} tabIndex={0} role="region" aria-label={caption}>
      <table className={table.table}>
        <caption className={table.caption}>{caption}</caption>
        <thead>
          <tr>
            {['Type', 'Volts', 'Current', 'What it is', 'Source', 'Status'].map((title) => (
              <th key={title} scope="col" className={table.head}>
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {items.map((item, index) => (
            <tr key={`${item.type} ${index}`} className={table.row}>
              <th scope="row" className={table.cell}>
                {item.type}
              </th>
              <td className={table.plain}>{formatQuantity(item.volts, 'V', 3)}</td>
              <td className={table.plain}>{formatQuantity(item.amps, 'A', 3)}</td>
              <td className={table.cell}>{remarksOf(item)}</td>
              <td className={table.cell}>{item.source}</td>
              <td className={table.cell}>
                <StatusBadge tone={item.status.startsWith('from memory') ? 'warn' : 'calm'}>
                  {item.status}
                </StatusBadge>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

/** What else is known about a type, in a line. */
export function remarksOf({ role, base, beadColour, note }: PartFact): string {
  return [role, base, beadColour && `${beadColour} bead`, note].filter(Boolean).join(', ');
}
