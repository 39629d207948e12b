import { lazy, Suspense, useState } from 'react';
import { Outlet, useNavigate, useParams } from 'react-router-dom';
import { paths } from '@/app/paths';
import { FailedState } from '@/components/FailedState';
import { LoadingState } from '@/components/LoadingState';
import { useCase } from '@/features/cases/api/get-case';
import { CaseFrame } from '@/features/cases/components/CaseFrame';
import { CautionsDialog } from '@/features/cases/components/CautionsDialog';
import { useReadings } from '@/features/readings/api/get-readings';
import { useDiagnosis } from '@/features/suspects/api/get-diagnosis';
import { type CaseReading } from '@/lib/bench/case-reading';
import { type Place } from '@/lib/bench/places';
import { confirmableFaults } from '@/features/cases/words/confirmable-faults';
import { type CaseScreen } from './case-screen';

const CloseCaseDialog = lazy(() =>
  import('@/features/cases/components/CloseCaseDialog').then((module) => ({
    default: module.CloseCaseDialog,
  })),
);

const NO_READINGS: CaseReading[] = [];

/** One case: its frame, its dialogs, and what its sections share. */
export function Component() {
  const { caseId = '' } = useParams();
  const navigate = useNavigate();
  const found = useCase(caseId);
  const readings = useReadings(caseId);
  const diagnosis = useDiagnosis(caseId, readings.data, found.data?.version);
  const [dialog, setDialog] = useState<'cautions' | 'closing'>();
  const [part, setPart] = useState<string>();
  const [goTo, setGoTo] = useState<Place>();
  if (found.isPending) return <LoadingState label="Fetching the case" />;
  if (found.isLoadingError)
    return <FailedState error={found.error} onRetry={() => void found.refetch()} />;

  const repair = found.data;
  const result = readings.data?.length ? diagnosis.data?.result : undefined;
  const screen: CaseScreen = {
    caseId,
    repair,
    readings: readings.data ?? NO_READINGS,
    result,
    part,
    goTo,
    refetchCase: () => void found.refetch(),
    askForCautions: () => setDialog('cautions'),
    askToClose: () => setDialog('closing'),
    selectPart: setPart,
    enterReading: (place) => {
      setGoTo({ ...place });
      void navigate(paths.case(caseId, 'readings'));
    },
    showWorking: (ref) => {
      setPart(ref);
      void navigate(paths.case(caseId, 'working'));
    },
  };
  const closeDialog = () => setDialog(undefined);
  return (
    <CaseFrame repair={repair} linkTo={(section) => paths.case(caseId, section)}>
      <Outlet context={screen} />
      {dialog === 'cautions' && (
        <CautionsDialog
          caseId={caseId}
          set={repair.set}
          netlist={repair.netlist}
          onClose={closeDialog}
        />
      )}
      {dialog === 'closing' && (
        <Suspense fallback={<LoadingState label="Opening the form" />}>
          <CloseCaseDialog
            repair={repair}
            proposed={confirmableFaults(result)}
            onClose={closeDialog}
          />
        </Suspense>
      )}
    </CaseFrame>
  );
}
