import { WorkingPanel } from '@/features/working/components/WorkingPanel';
import { useCaseScreen } from './case-screen';

/** The equations behind the computed values. */
export function Component() {
  const { caseId, repair, readings, part } = useCaseScreen();
  return (
    <WorkingPanel
      key={part}
      caseId={caseId}
      netlist={repair.netlist}
      readings={readings}
      caseVersion={repair.version}
      part={part}
    />
  );
}
