import { createContext, useContext, useEffect, useState, useSyncExternalStore, type ReactNode } from 'react';
import { createDraftKeeper, type DraftKeeper, type DraftSnapshot } from './draft-keeper.ts';
import { keeperCalls, type OpenedDraft } from './draft.queries.ts';

const Context = createContext<DraftKeeper | null>(null);

interface DraftProviderProps extends OpenedDraft {
  memberId: string;
  children: ReactNode;
}

/** Keeps a draft for the pages of its form: saves on leaving, when the connection is back, and when another device saved first. */
export function DraftProvider({ memberId, lot, kept, children }: DraftProviderProps) {
  const [keeper] = useState(() => createDraftKeeper({ lot, kept, ...keeperCalls(memberId, lot.code) }));
  useEffect(() => {
    const save = () => void keeper.flush();
    const look = () => void (document.hidden ? keeper.flush() : keeper.refresh());
    void keeper.keepHere();
    save();
    addEventListener('online', save);
    addEventListener('pagehide', save);
    document.addEventListener('visibilitychange', look);
    return () => {
      removeEventListener('online', save);
      removeEventListener('pagehide', save);
      document.removeEventListener('visibilitychange', look);
      void keeper.flush().then(keeper.stop);
    };
  }, [keeper]);
  return <Context value={keeper}>{children}</Context>;
}

export type Draft = DraftSnapshot & Omit<DraftKeeper, 'snapshot' | 'subscribe' | 'keepHere' | 'stop'>;

/** The draft of the page and what can be done with it. Only below a `DraftProvider`. */
export function useDraft(): Draft {
  const keeper = useContext(Context);
  if (!keeper) throw new Error('useDraft stands outside a DraftProvider');
  const snapshot = useSyncExternalStore(keeper.subscribe, keeper.snapshot);
  const { edit, flush, refresh, setPhotos, keepMine, takeOther } = keeper;
  return { ...snapshot, edit, flush, refresh, setPhotos, keepMine, takeOther };
}
