import { call } from '@lydite/client';
import type { MyLotView } from '@lydite/contracts';
import { queryOptions } from '@tanstack/react-query';
import { forgetOthers, openDeviceStore } from '../../lib/device-store.ts';
import type { KeeperParts, KeptDraft } from './draft-keeper.ts';

const device = openDeviceStore('drafts');
const deviceKey = (memberId: string, lotCode: string) => `${memberId}/${lotCode}`;

export interface OpenedDraft {
  lot: MyLotView;
  kept: KeptDraft | undefined;
}

const readLot = (lotCode: string) => call('GET /my/lots/:lotCode', { params: { lotCode } });

/** The draft and what this device kept of it. Asked for on every visit, and never behind the back of the one who edits it. */
export const openedDraftQuery = (memberId: string, lotCode: string) =>
  queryOptions({
    queryKey: ['lots', 'opened', memberId, lotCode],
    queryFn: async (): Promise<OpenedDraft> => {
      await forgetOthers(device, memberId);
      const [lot, kept] = await Promise.all([readLot(lotCode), device.read<KeptDraft>(deviceKey(memberId, lotCode))]);
      return { lot, kept };
    },
    staleTime: Infinity,
    gcTime: 0,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });

/** How a keeper reaches the market and this device. */
export const keeperCalls = (memberId: string, lotCode: string): Pick<KeeperParts, 'save' | 'reload' | 'mirror'> => ({
  save: (body) => call('PUT /my/lots/:lotCode', { params: { lotCode }, body }),
  reload: () => readLot(lotCode),
  mirror: (kept) => device.write(deviceKey(memberId, lotCode), kept),
});

/** Drops this device's copy of a draft that is listed or deleted. */
export const forgetKept = (memberId: string, lotCode: string): Promise<void> =>
  device.remove([deviceKey(memberId, lotCode)]);
