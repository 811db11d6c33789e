import { useEffect, useRef, type MouseEvent } from 'react';

export interface FieldProblem {
  /** The id given to the field. */
  fieldId: string;
  message: string;
}

/** What is wrong with a form, after it was sent: takes the focus, links to each field and marks the page's title. */
export function ErrorSummary({ problems }: { problems: readonly FieldProblem[] }) {
  const box = useRef<HTMLDivElement>(null);
  const key = problems.map(({ fieldId, message }) => `${fieldId} ${message}`).join('\n');

  useEffect(() => {
    if (key === '') return;
    box.current?.focus();
    const { title } = document;
    document.title = `Error: ${title}`;
    return () => {
      document.title = title;
    };
  }, [key]);

  if (problems.length === 0) return null;
  const goTo = (event: MouseEvent, fieldId: string) => {
    const field = document.getElementById(fieldId);
    if (!field) return;
    event.preventDefault();
    field.scrollIntoView({ block: 'center' });
    field.focus();
  };
  return (
    <div className="error-summary" ref={box} role="group" tabIndex={-1} aria-labelledby="error-summary-title">
      <div role="alert">
        <h2 id="error-summary-title">There is a problem</h2>
        <ul>
          {problems.map(({ fieldId, message }) => (
            <li key={fieldId}>
              <a href={`#${fieldId}`} onClick={(event) => goTo(event, fieldId)}>
                {message}
              </a>
            </li>
          ))}
        </ul>
      </div>
    </div>
  );
}
