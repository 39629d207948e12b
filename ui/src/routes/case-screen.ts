import { useOutletContext } from 'react-router-dom';
import { type DiagnosisResult } from '@engine/diagnosis-types';
import { type Case } from '@/lib/api-model';
import { type CaseReading } from '@/lib/bench/case-reading';
import { type Place } from '@/lib/bench/places';

/** What the sections of a case share. */
export interface CaseScreen {
  caseId: string;
  repair: Case;
  readings: readonly CaseReading[];
  /** Newest answer of the engine, once there are readings. */
  result?: DiagnosisResult;
  /** Part that is pointed at in the circuit. */
  part?: string;
  /** Place to jump to in the readings; a new object jumps again. */
  goTo?: Place;
  refetchCase: () => void;
  askForCautions: () => void;
  askToClose: () => void;
  selectPart: (ref: string) => void;
  enterReading: (place: Place) => void;
  showWorking: (part: string) => void;
}

/** The case that the section belongs to. */
export function useCaseScreen(): CaseScreen {
  return useOutletContext<CaseScreen>();
}
