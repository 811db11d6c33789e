import type { ReactNode } from 'react';

interface PageProps {
  /** `rail`: a rail and the content. `form`: steps, form and a side. `narrow`: one column of text. */
  shape?: 'plain' | 'rail' | 'form' | 'narrow';
  children: ReactNode;
}

const shapes = { plain: 'page', rail: 'page page-rail', form: 'page page-form', narrow: 'page page-narrow' } as const;

/** The page's main part, where the skip link leads. */
export function Page({ shape = 'plain', children }: PageProps) {
  return (
    <main id="main" tabIndex={-1} className={shapes[shape]}>
      {children}
    </main>
  );
}

interface PageHeadProps {
  title: ReactNode;
  /** Short facts under the title. */
  facts?: readonly ReactNode[];
  /** At the right: what is due and when. The first `b` is set large. */
  end?: ReactNode;
}

/** A page's title with its facts. */
export function PageHead({ title, facts = [], end }: PageHeadProps) {
  return (
    <div className="page-head">
      <div>
        <h1>{title}</h1>
        {facts.length > 0 && (
          <p className="facts">
            {facts.map((fact, i) => (
              <span key={i}>{fact}</span>
            ))}
          </p>
        )}
      </div>
      {end && <div className="page-head-end">{end}</div>}
    </div>
  );
}
