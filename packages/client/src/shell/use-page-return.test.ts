import { cleanup, renderHook } from '@testing-library/react';
import { afterEach, expect, it, vi } from 'vitest';
import { usePageReturn } from './use-page-return.ts';

afterEach(cleanup);

const show = (persisted: boolean) => window.dispatchEvent(Object.assign(new Event('pageshow'), { persisted }));

it('notices a return to the page as it was left, and no fresh load', () => {
  const onReturn = vi.fn<() => void>();
  const { unmount } = renderHook(() => usePageReturn(onReturn));
  show(false);
  expect(onReturn).not.toHaveBeenCalled();
  show(true);
  expect(onReturn).toHaveBeenCalledTimes(1);
  unmount();
  show(true);
  expect(onReturn).toHaveBeenCalledTimes(1);
});
