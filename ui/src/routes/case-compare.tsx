import { ComparePanel } from '@/features/compare/components/ComparePanel';
import { useCaseScreen } from './case-screen';

/** Measured against computed. */
export function Component() {
  const { caseId, repair, readings, showWorking } = useCaseScreen();
  return (
    <ComparePanel
      caseId={caseId}
      netlist={repair.netlist}
      readings={readings}
      caseVersion={repair.version}
      onShowWorking={showWorking}
    />
  );
}
