import { ApiError } from '@lydite/client';
import type { LotDraft, MyLotView } from '@lydite/contracts';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { aDraft, aLot } from '../../lib/draft.fixture.ts';
import { createDraftKeeper, type KeptDraft } from './draft-keeper.ts';

beforeEach(() => void vi.useFakeTimers());
afterEach(() => void vi.useRealTimers());

const refusal = (code: 'network' | 'lot.changed' | 'lot.wrong_state' | 'request.invalid', more = {}) =>
  new ApiError({
    code,
    status: code === 'network' ? 0 : 409,
    detail: `refused: ${code}`,
    fields: [],
    requestId: 'r',
    ...more,
  });

/** A market that keeps one draft by the rules of versions, and can be told to fail. */
function market(lot: MyLotView = aLot()) {
  const state = { lot, failWith: null as Error | null, saves: 0, kept: undefined as KeptDraft | undefined };
  const save = vi.fn<(request: KeptDraft) => Promise<MyLotView>>(async ({ version, draft }) => {
    await Promise.resolve();
    if (state.failWith) throw state.failWith;
    if (version !== state.lot.version) throw refusal('lot.changed', { context: { current: state.lot } });
    state.saves += 1;
    state.lot = { ...state.lot, draft, version: version + 1 };
    return state.lot;
  });
  const open = (kept?: KeptDraft) =>
    createDraftKeeper({
      lot: state.lot,
      kept,
      save,
      reload: () => Promise.resolve(state.lot),
      mirror: (copy) => {
        state.kept = copy;
        return Promise.resolve(true);
      },
    });
  return { state, save, open };
}

const titled = (title: string) => (draft: LotDraft) => ({ ...draft, title });

describe('saving', () => {
  it('saves five seconds after the first change, whatever is typed meanwhile', async () => {
    const { state, open } = market();
    const keeper = open();
    keeper.edit(titled('One'));
    await vi.advanceTimersByTimeAsync(3000);
    keeper.edit(titled('One two'));
    expect(keeper.snapshot().state).toBe('changed');
    await vi.advanceTimersByTimeAsync(2100);
    expect(state.lot.draft.title).toBe('One two');
    expect(state.saves).toBe(1);
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', lot: { version: 4 } });
  });

  it('keeps what is typed while a save is under way, and saves it next', async () => {
    const { state, open } = market();
    const keeper = open();
    keeper.edit(titled('One'));
    const flushed = keeper.flush();
    keeper.edit(titled('Two'));
    await flushed;
    expect(keeper.snapshot()).toMatchObject({ state: 'changed', draft: { title: 'Two' } });
    await keeper.flush();
    expect(state.lot).toMatchObject({ version: 5, draft: { title: 'Two' } });
  });

  it('saves once when told twice at the same time', async () => {
    const { save, open } = market();
    const keeper = open();
    keeper.edit(titled('One'));
    await Promise.all([keeper.flush(), keeper.flush()]);
    expect(save).toHaveBeenCalledTimes(1);
  });

  it('copies every change to the device, before it is saved', async () => {
    const { state, open } = market();
    const keeper = open();
    keeper.edit(titled('Kept'));
    await vi.advanceTimersByTimeAsync(400);
    expect(state.kept).toMatchObject({ version: 3, draft: { title: 'Kept' } });
    expect(keeper.snapshot().isKeptHere).toBe(true);
  });
});

describe('failing', () => {
  it('keeps trying while there is no connection, and loses nothing', async () => {
    const { state, open } = market();
    const keeper = open();
    state.failWith = refusal('network');
    keeper.edit(titled('Offline'));
    await keeper.flush();
    expect(keeper.snapshot()).toMatchObject({ state: 'offline', draft: { title: 'Offline' } });
    state.failWith = null;
    await vi.advanceTimersByTimeAsync(10_100);
    expect(state.lot.draft.title).toBe('Offline');
    expect(keeper.snapshot().state).toBe('saved');
  });

  it('names the figures the market does not take, and tries again after the next change', async () => {
    const { state, open } = market();
    const keeper = open();
    state.failWith = refusal('request.invalid', {
      status: 400,
      fields: [{ path: 'draft.title', message: 'At most 90 characters.' }],
    });
    keeper.edit(titled('Long'));
    await keeper.flush();
    expect(keeper.snapshot()).toMatchObject({
      state: 'refused',
      problems: [{ path: 'title', message: 'At most 90 characters.' }],
    });
    state.failWith = null;
    keeper.edit(titled('Short'));
    await keeper.flush();
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', problems: [] });
  });

  it('says so when the lot was listed meanwhile', async () => {
    const { state, open } = market();
    const keeper = open();
    state.failWith = refusal('lot.wrong_state');
    keeper.edit(titled('Late'));
    await keeper.flush();
    expect(keeper.snapshot().state).toBe('listed');
  });
});

describe('two versions', () => {
  const elsewhere = (state: { lot: MyLotView }, title: string) => {
    state.lot = { ...state.lot, version: state.lot.version + 1, draft: { ...state.lot.draft, title } };
  };

  it('never writes over what was saved elsewhere', async () => {
    const { state, open } = market();
    const keeper = open();
    elsewhere(state, 'Theirs');
    keeper.edit(titled('Mine'));
    await keeper.flush();
    expect(state.lot.draft.title).toBe('Theirs');
    expect(keeper.snapshot()).toMatchObject({ state: 'conflict', draft: { title: 'Mine' }, other: { version: 4 } });
    await vi.advanceTimersByTimeAsync(60_000);
    expect(state.saves).toBe(0);
  });

  it('saves mine over the other when told to', async () => {
    const { state, open } = market();
    const keeper = open();
    elsewhere(state, 'Theirs');
    keeper.edit(titled('Mine'));
    await keeper.flush();
    await keeper.keepMine();
    expect(state.lot).toMatchObject({ version: 5, draft: { title: 'Mine' } });
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', other: null });
  });

  it('takes the other when told to', async () => {
    const { state, open } = market();
    const keeper = open();
    elsewhere(state, 'Theirs');
    keeper.edit(titled('Mine'));
    await keeper.flush();
    await keeper.takeOther();
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', draft: { title: 'Theirs' }, lot: { version: 4 } });
    expect(state.kept).toMatchObject({ version: 4, draft: { title: 'Theirs' } });
  });

  it('asks nothing when both say the same', async () => {
    const { state, open } = market();
    const keeper = open();
    elsewhere(state, 'Same');
    keeper.edit(titled('Same'));
    await keeper.flush();
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', lot: { version: 4 } });
  });

  it('follows another device while nothing was changed here', async () => {
    const { state, open } = market();
    const keeper = open();
    elsewhere(state, 'Theirs');
    await keeper.refresh();
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', draft: { title: 'Theirs' }, lot: { version: 4 } });
  });
});

describe('a reload', () => {
  it('goes on with what the device kept of the same version', async () => {
    const { state, open } = market();
    const keeper = open({ version: 3, draft: aDraft({ title: 'Unsaved' }) });
    expect(keeper.snapshot()).toMatchObject({ state: 'changed', draft: { title: 'Unsaved' } });
    await keeper.flush();
    expect(state.lot.draft.title).toBe('Unsaved');
  });

  it('lets the seller choose when the kept version is older', () => {
    const keeper = market().open({ version: 2, draft: aDraft({ title: 'Old' }) });
    expect(keeper.snapshot()).toMatchObject({ state: 'conflict', draft: { title: 'Old' }, other: { version: 3 } });
  });

  it('drops a copy that says nothing new', () => {
    const keeper = market().open({ version: 2, draft: aDraft() });
    expect(keeper.snapshot()).toMatchObject({ state: 'saved', other: null });
  });
});
