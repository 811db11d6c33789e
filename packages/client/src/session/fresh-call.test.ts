import { afterEach, describe, expect, it, vi } from 'vitest';
import { ApiError } from '../call/api-error.ts';
import { registerPasswordDialog, withFreshPassword } from './fresh-call.ts';

const stale = () => new ApiError({ code: 'session.stale', status: 403, detail: '', fields: [], requestId: '' });
let unregister = () => {};
afterEach(() => unregister());

describe('a call that moves money', () => {
  it('asks for the password when it was entered too long ago, then goes on', async () => {
    const ask = vi.fn<() => Promise<void>>(() => Promise.resolve());
    unregister = registerPasswordDialog(ask);
    const run = vi.fn<() => Promise<string>>().mockRejectedValueOnce(stale()).mockResolvedValueOnce('done');
    await expect(withFreshPassword(run)).resolves.toBe('done');
    expect([ask.mock.calls.length, run.mock.calls.length]).toEqual([1, 2]);
  });
  it('does nothing when the password is not entered', async () => {
    unregister = registerPasswordDialog(() => Promise.reject(new Error('closed')));
    const run = vi.fn<() => Promise<void>>(() => Promise.reject(stale()));
    await expect(withFreshPassword(run)).rejects.toThrow('closed');
    expect(run).toHaveBeenCalledTimes(1);
  });
  it('asks nothing about other refusals', async () => {
    const ask = vi.fn<() => Promise<void>>(() => Promise.resolve());
    unregister = registerPasswordDialog(ask);
    const other = new ApiError({ code: 'deal.frozen', status: 409, detail: '', fields: [], requestId: '' });
    await expect(withFreshPassword(() => Promise.reject(other))).rejects.toBe(other);
    expect(ask).not.toHaveBeenCalled();
  });
});
