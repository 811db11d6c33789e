import { call } from '@lydite/client';
import type { MyLotView } from '@lydite/contracts';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useOnce } from '../../lib/use-once.ts';

interface Saved {
  state: string;
  lot: MyLotView;
}

/**
 * Saves a draft and opens it to the market. The version is the one on the page: a draft changed elsewhere is not listed unseen.
 */
export function useListLot(save: () => Promise<Saved>) {
  const cache = useQueryClient();
  return useMutation({
    mutationFn: useOnce(async () => {
      const { state, lot } = await save();
      if (state !== 'saved') throw new Error('The draft could not be saved, so it was not listed. Nothing is lost.');
      const { code: lotCode, version } = lot;
      return call('POST /my/lots/:lotCode/list', { params: { lotCode }, body: { version } });
    }),
    onSuccess: () => cache.invalidateQueries({ queryKey: ['lots', 'own'] }),
  });
}
