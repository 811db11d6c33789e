import { Button } from '@lydite/ui';
import { useId, type FormEvent } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { useDeskSearch } from './use-desk-search.ts';

/** Searches a list by its words; the text goes into the address, so that a list can be sent to a colleague. */
export function SearchForm({ hint }: { hint: string }) {
  const id = useId();
  const { q } = useDeskSearch();
  const [, setSearch] = useSearchParams();
  const submit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const typed = new FormData(event.currentTarget).get('q');
    const text = typeof typed === 'string' ? typed.trim() : '';
    setSearch(text ? { q: text } : {});
  };
  return (
    <form role="search" onSubmit={submit} className="mt-4">
      <label htmlFor={id} className="small mute">
        Search by {hint}
      </label>
      <div className="mt-1 flex flex-wrap items-center gap-3">
        <span className="input min-h-11! min-w-48 max-w-96 grow">
          <input key={q ?? ''} id={id} type="search" name="q" defaultValue={q} maxLength={80} />
        </span>
        <Button type="submit">Search</Button>
        {q && <Link to="?">Show all</Link>}
      </div>
    </form>
  );
}
