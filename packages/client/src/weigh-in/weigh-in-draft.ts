import type { PhotoView } from '@lydite/contracts';
import type { WeighInEntries } from './weigh-in.rules.ts';

export interface WeighInDraft extends WeighInEntries {
  /** Photos that are on the server already. */
  photos: PhotoView[];
}

const blank = (unit: string) => ({ text: '', unit, value: null });

const emptyDraft = (): WeighInDraft => ({
  gross: blank('kg'),
  tare: blank('kg'),
  resolution: blank('g'),
  scaleSerial: '',
  note: '',
  photos: [],
});

const keyOf = (dealCode: string) => `lydite.weigh-in.${dealCode}`;
const scaleKey = 'lydite.scale';

/** What was entered before on this device: this weigh-in, or else the scale used last. */
export function readDraft(dealCode: string): WeighInDraft {
  const parse = (kept: string | null): Partial<WeighInDraft> => (kept ? (JSON.parse(kept) as object) : {});
  return {
    ...emptyDraft(),
    ...parse(localStorage.getItem(scaleKey)),
    ...parse(localStorage.getItem(keyOf(dealCode))),
  };
}

export const keepDraft = (dealCode: string, draft: WeighInDraft): void =>
  localStorage.setItem(keyOf(dealCode), JSON.stringify(draft));

/** Once it is entered, only the scale is worth keeping: it is offered again next time. */
export function closeDraft(dealCode: string, { resolution, scaleSerial }: WeighInDraft): void {
  localStorage.removeItem(keyOf(dealCode));
  localStorage.setItem(scaleKey, JSON.stringify({ resolution, scaleSerial }));
}
