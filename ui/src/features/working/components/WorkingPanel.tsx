import { type Netlist } from '@engine/netlist/types';
import { type CaseReading } from '@/lib/bench/case-reading';

export interface WorkingPanelProps {
  caseId: string;
  netlist: Netlist;
  readings: readonly CaseReading[];
  caseVersion?: number;
  /** Part chosen at first for the closed form. */
  part?: string;
}

/** Equations, solution and closed form behind the computed values. */
export function WorkingPanel(_props: WorkingPanelProps) {
  return null;
}
