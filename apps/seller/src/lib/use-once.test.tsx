import { cleanup, renderHook } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import { useOnce } from './use-once.ts';

afterEach(cleanup);

it('sends once for a double press, and again for a later one', async () => {
  const send = vi.fn<() => Promise<number>>().mockResolvedValueOnce(1).mockResolvedValueOnce(2);
  const { result } = renderHook(() => useOnce(send));
  expect(await Promise.all([result.current(), result.current()])).toEqual([1, 1]);
  expect(await result.current()).toBe(2);
  expect(send).toHaveBeenCalledTimes(2);
});

it('lets a press after a refusal try anew', async () => {
  const send = vi.fn<() => Promise<number>>().mockRejectedValueOnce(new Error('refused')).mockResolvedValueOnce(2);
  const { result } = renderHook(() => useOnce(send));
  await expect(result.current()).rejects.toThrow('refused');
  expect(await result.current()).toBe(2);
});
