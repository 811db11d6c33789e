import { FormSteps } from '@lydite/ui';
import { Link } from 'react-router-dom';
import { stepIds, stepNames, type StepId } from '../steps.ts';
import { SavedLine } from './SavedLine.tsx';

interface DraftStepsProps {
  code: string;
  current: StepId;
  notes: Record<StepId, string>;
}

/** The five pages of a new lot, in any order. */
export function DraftSteps({ code, current, notes }: DraftStepsProps) {
  return (
    <FormSteps
      // A new page closes the list that phones open to get there.
      key={current}
      title={`New lot ${code}, draft`}
      steps={stepIds.map((id) => ({ id, name: stepNames[id], note: notes[id], isCurrent: id === current }))}
      link={({ id, isCurrent }, children) => (
        <Link to={`/lots/${code}/${id}`} aria-current={isCurrent ? 'step' : undefined}>
          {children}
        </Link>
      )}
      saved={<SavedLine />}
    />
  );
}
