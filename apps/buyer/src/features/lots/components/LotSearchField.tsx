import type { LotQuery } from '@lydite/contracts';
import { useEffect, useRef, type FormEvent, type RefObject } from 'react';
import { useNavigate } from 'react-router-dom';
import { lotSearch } from '../lot-search.ts';

const pauseMs = 300;

/** Search by words or by a lot's code; `/` leads here from anywhere on the page. */
export function LotSearchField({ query }: { query: LotQuery }) {
  const { input, search, searchNow } = useSearch(query);
  useSlashKey(input);
  const submit = (event: FormEvent) => {
    event.preventDefault();
    search(0);
  };
  return (
    <form role="search" onSubmit={submit}>
      <input
        ref={input}
        type="search"
        className="chip rack-search"
        aria-label="Search lots"
        aria-keyshortcuts="/"
        placeholder="Search /"
        maxLength={80}
        defaultValue={query.q}
        onChange={() => search(pauseMs)}
        onBlur={searchNow}
      />
    </form>
  );
}

/** Asks for what is typed once typing pauses. The field follows the address where a link or the way back has changed it. */
function useSearch(query: LotQuery) {
  const input = useRef<HTMLInputElement>(null);
  const navigate = useNavigate();
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  const sent = useRef(query.q ?? '');
  useEffect(() => {
    const asked = query.q ?? '';
    if (asked === sent.current || !input.current) return;
    sent.current = asked;
    input.current.value = asked;
  }, [query.q]);
  useEffect(() => () => clearTimeout(timer.current), []);
  const search = (afterMs: number) => {
    clearTimeout(timer.current);
    timer.current = setTimeout(() => {
      timer.current = undefined;
      sent.current = input.current?.value.trim() ?? '';
      void navigate({ search: lotSearch(query, { q: sent.current }) }, { replace: true, preventScrollReset: true });
    }, afterMs);
  };
  /** Leaving the field asks at once: a search that came later would call off the page the reader has gone on to. */
  const searchNow = () => timer.current !== undefined && search(0);
  return { input, search, searchNow };
}

function useSlashKey(input: RefObject<HTMLInputElement | null>): void {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      const types = event.target instanceof HTMLElement && event.target.closest('input, select, textarea, dialog');
      if (event.key !== '/' || types || event.ctrlKey || event.metaKey || event.altKey) return;
      event.preventDefault();
      input.current?.select();
      input.current?.focus();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [input]);
}
