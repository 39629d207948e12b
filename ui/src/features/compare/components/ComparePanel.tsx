import { type Netlist } from '@engine/netlist/types';
import { type CaseReading } from '@/lib/bench/case-reading';

export interface ComparePanelProps {
  caseId: string;
  netlist: Netlist;
  /** Readings as the service keeps them; compared again when they change. */
  readings: readonly CaseReading[];
  /** Version of the case; compared again when circuit or line voltage change. */
  caseVersion?: number;
  /** Offered on each part row: show the working for it. */
  onShowWorking?: (part: string) => void;
}

/** Measured against computed: plot and table. */
export function ComparePanel(_props: ComparePanelProps) {
  return null;
}
