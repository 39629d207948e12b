import { type NextReading } from '@engine/diagnosis-types';
import { type AsFound, type Netlist } from '@engine/netlist/types';
import { type Place } from '@/lib/bench/places';

export interface ReadingsPanelProps {
  caseId: string;
  netlist: Netlist;
  /** Parts added as found get rows too. */
  asFound?: AsFound[];
  /** Suggested readings, best first; the first one is pointed out at the top. */
  nextReadings?: NextReading[];
  /** True once this person has acknowledged the cautions on this case. */
  isCautionAcknowledged: boolean;
  /** Called when a powered reading is wanted before the cautions were acknowledged. */
  onNeedCautions: () => void;
  /** False shows the readings without letting anybody type (a closed case). */
  canRecord?: boolean;
  /** Place to jump to, for "Enter this reading" elsewhere; a new object jumps again. */
  goTo?: Place;
}

/** The grid of a case's readings. */
export function ReadingsPanel(_props: ReadingsPanelProps) {
  return null;
}
