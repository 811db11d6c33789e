import { isApiError } from '@lydite/client';
import type { FieldError, LotDraft, MyLotView } from '@lydite/contracts';
import { isSameDraft } from './draft-differences.ts';

const saveAfterMs = 5_000;
const retryAfterMs = 10_000;
const mirrorAfterMs = 300;

/** A draft as this device keeps it, with the version of the market's draft it was made from. */
export interface KeptDraft {
  version: number;
  draft: LotDraft;
}

/**
 * `offline`: kept here, sent again by itself. `refused`: a figure the market can't take stands in it. `conflict`: saved
 * elsewhere meanwhile, the seller has to choose. `listed`: it is no draft any more.
 */
export type SaveState = 'saved' | 'changed' | 'saving' | 'offline' | 'refused' | 'conflict' | 'listed';

export interface DraftSnapshot {
  /** The lot as the market last had it. */
  lot: MyLotView;
  /** The draft as it stands on the page. */
  draft: LotDraft;
  state: SaveState;
  /** Whether this device has a copy too. */
  isKeptHere: boolean;
  /** Why it was not saved. */
  message: string;
  problems: FieldError[];
  /** In a conflict: the lot as it was saved elsewhere. */
  other: MyLotView | null;
}

export interface KeeperParts {
  lot: MyLotView;
  kept?: KeptDraft | undefined;
  save: (request: KeptDraft) => Promise<MyLotView>;
  reload: () => Promise<MyLotView>;
  /** Keeps a copy on the device; false when it would not. */
  mirror: (kept: KeptDraft) => Promise<boolean>;
}

export type DraftKeeper = ReturnType<typeof createDraftKeeper>;

/**
 * Holds a draft while it is edited: saves it to the market a few seconds after a change or when told to, mirrors every change
 * on the device at once, and never writes over what was saved elsewhere. One save runs at a time.
 */
export function createDraftKeeper({ lot, kept, save, reload, mirror }: KeeperParts) {
  let snapshot = firstSnapshot(lot, kept);
  const listeners = new Set<() => void>();
  let saveTimer: ReturnType<typeof setTimeout> | undefined;
  let mirrorTimer: ReturnType<typeof setTimeout> | undefined;
  let running: Promise<void> | undefined;

  const put = (change: Partial<DraftSnapshot>) => {
    snapshot = { ...snapshot, ...change };
    for (const listener of listeners) listener();
  };
  /** Copies the draft to the device. */
  const keepHere = async () => {
    clearTimeout(mirrorTimer);
    mirrorTimer = undefined;
    const isKeptHere = await mirror({ version: snapshot.lot.version, draft: snapshot.draft });
    if (isKeptHere !== snapshot.isKeptHere) put({ isKeptHere });
  };
  const schedule = (afterMs: number) => {
    clearTimeout(saveTimer);
    saveTimer = setTimeout(() => void flush(), afterMs);
  };

  const edit = (change: (draft: LotDraft) => LotDraft) => {
    const draft = change(snapshot.draft);
    if (draft === snapshot.draft) return;
    const isBlocked = snapshot.state === 'conflict' || snapshot.state === 'listed';
    put({ draft, ...(isBlocked ? {} : { state: running ? 'saving' : 'changed', problems: [], message: '' }) });
    mirrorTimer ??= setTimeout(() => void keepHere(), mirrorAfterMs);
    if (!isBlocked && !saveTimer) schedule(saveAfterMs);
  };

  /** Saves now what is not saved yet; resolves with how things stand when nothing more can be done at the moment. */
  const flush = async (): Promise<DraftSnapshot> => {
    clearTimeout(saveTimer);
    saveTimer = undefined;
    if (mirrorTimer) void keepHere();
    if (running) await running;
    if (snapshot.state !== 'changed' && snapshot.state !== 'offline') return snapshot;
    running ??= send().finally(() => (running = undefined));
    await running;
    return snapshot;
  };

  const send = async () => {
    const { draft, lot: base } = snapshot;
    put({ state: 'saving' });
    try {
      const saved = await save({ version: base.version, draft });
      const isWhole = snapshot.draft === draft;
      put({ lot: saved, state: isWhole ? 'saved' : 'changed', message: '', problems: [] });
      void keepHere();
      if (!isWhole) schedule(saveAfterMs);
    } catch (error) {
      put(afterFailure(error, snapshot));
      if (snapshot.state === 'offline') schedule(retryAfterMs);
      if (snapshot.state === 'saved') void keepHere();
    }
  };

  /** Looks at what the market has now; a page without changes of its own follows a save made elsewhere. */
  const refresh = async () => {
    const fresh = await reload().catch(() => null);
    if (!fresh || running) return;
    if (fresh.state !== 'draft') put({ lot: fresh, state: 'listed' });
    else if (snapshot.state === 'saved')
      put({ lot: fresh, draft: fresh.version === snapshot.lot.version ? snapshot.draft : fresh.draft });
    else if (fresh.version === snapshot.lot.version) put({ lot: fresh });
  };

  return {
    snapshot: () => snapshot,
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
    edit,
    flush,
    keepHere,
    refresh,
    /** Photos are saved on their own; the page's draft is not touched by them. */
    setPhotos: (photos: MyLotView['photos']) => put({ lot: { ...snapshot.lot, photos } }),
    /** Answers a conflict: what stands here is saved over the other version. */
    keepMine: async () => {
      if (!snapshot.other) return;
      put({ lot: snapshot.other, other: null, state: 'changed' });
      await flush();
    },
    /** Answers a conflict: what stands here gives way. */
    takeOther: async () => {
      if (!snapshot.other) return;
      put({ lot: snapshot.other, draft: snapshot.other.draft, other: null, state: 'saved' });
      await keepHere();
    },
    stop: () => {
      clearTimeout(saveTimer);
      clearTimeout(mirrorTimer);
      saveTimer = mirrorTimer = undefined;
    },
  };
}

/** A device that kept changes of the same version goes on with them; of an older one, the seller chooses. */
function firstSnapshot(lot: MyLotView, kept: KeptDraft | undefined): DraftSnapshot {
  const isNews = kept !== undefined && !isSameDraft(kept.draft, lot.draft);
  const isOld = isNews && kept.version !== lot.version;
  return {
    lot,
    draft: isNews ? kept.draft : lot.draft,
    state: !isNews ? 'saved' : isOld ? 'conflict' : 'changed',
    isKeptHere: kept !== undefined,
    message: '',
    problems: [],
    other: isOld ? lot : null,
  };
}

function afterFailure(error: unknown, { draft }: DraftSnapshot): Partial<DraftSnapshot> {
  if (!isApiError(error)) return { state: 'refused', message: (error as Error).message };
  const { code } = error;
  if (code === 'lot.changed') {
    const other = error.context.current as MyLotView;
    return isSameDraft(draft, other.draft)
      ? { state: 'saved', lot: other, message: '' }
      : { state: 'conflict', other, message: '' };
  }
  if (code === 'lot.wrong_state' || code === 'lot.not_found') return { state: 'listed', message: error.message };
  const isPassing = code === 'network' || code === 'request.too_many' || error.status >= 500;
  return {
    state: isPassing ? 'offline' : 'refused',
    message: error.message,
    problems: error.fields.map((field) => ({ ...field, path: field.path.replace(/^draft\./, '') })),
  };
}
