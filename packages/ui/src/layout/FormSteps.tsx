import { Fragment, type ReactNode } from 'react';

export interface FormStep {
  id: string;
  name: string;
  /** "3 parts, 1 to check", "Not started". */
  note: string;
  isCurrent: boolean;
}

interface FormStepsProps {
  /** "New lot, draft" */
  title: string;
  steps: readonly FormStep[];
  /** The app's own link; the current one carries `aria-current="step"`. */
  link: (step: FormStep, children: ReactNode) => ReactNode;
  /** Where the draft was saved, and when. */
  saved?: ReactNode;
}

/** A long form's pages in any order, with their state in words; on phones one line that opens into the list. */
export function FormSteps({ title, steps, link, saved }: FormStepsProps) {
  const at = steps.findIndex(({ isCurrent }) => isCurrent);
  const list = (
    <ol>
      {steps.map((step) => (
        <li key={step.id}>
          {link(
            step,
            <Fragment>
              {step.name}
              <small>{step.note}</small>
            </Fragment>,
          )}
        </li>
      ))}
    </ol>
  );
  return (
    <nav className="steps" aria-label={title}>
      <div className="steps-rail">
        <h2>{title}</h2>
        {list}
        {saved && <p className="tiny mute mt-4">{saved}</p>}
      </div>
      <details className="form-steps">
        <summary>
          <span>
            <b>{steps[at]?.name ?? title}</b>
            {at >= 0 && `, step ${at + 1} of ${steps.length}`}
          </span>
          <span>All steps</span>
        </summary>
        {list}
      </details>
      {saved && <p className="steps-saved tiny mute">{saved}</p>}
    </nav>
  );
}
