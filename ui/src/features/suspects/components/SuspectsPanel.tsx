import { type Netlist } from '@engine/netlist/types';
import { type CaseReading } from '@/lib/bench/case-reading';
import { type Place } from '@/lib/bench/places';

export interface SuspectsPanelProps {
  caseId: string;
  netlist: Netlist;
  /** Readings as the service keeps them; the diagnosis runs again when they change. */
  readings: readonly CaseReading[];
  /** Version of the case; the diagnosis runs again when circuit or line voltage change. */
  caseVersion?: number;
  /** "Enter this reading" on a suggested one. */
  onEnterReading?: (place: Place) => void;
  onSelectPart?: (ref: string) => void;
  /** "Show the working" on a suspect part. */
  onShowWorking?: (part: string) => void;
}

/** Ranked suspects of a case with their evidence, and the readings to take next. */
export function SuspectsPanel(_props: SuspectsPanelProps) {
  return null;
}
