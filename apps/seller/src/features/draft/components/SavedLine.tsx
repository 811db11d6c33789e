import { useMarket, useNow } from '@lydite/client';
import { formatDateTime } from '@lydite/ui';
import { useDraft } from '../draft-context.tsx';
import type { DraftSnapshot } from '../draft-keeper.ts';

/** When the draft was saved, in the market's time like every other: the time alone on the same day, else with its date. */
export function savedAtWords(iso: string, now: Date, zone: string): string {
  const day = (moment: string) => formatDateTime(moment, zone, { time: false });
  const [date, time] = formatDateTime(iso, zone, { weekday: false }).split(', ');
  return day(iso) === day(now.toISOString()) ? (time ?? '') : `${date}, ${time}`;
}

function useSavedAt(): string {
  const { lot } = useDraft();
  const { zone } = useMarket();
  return savedAtWords(lot.savedAt, useNow(), zone);
}

/** Where the draft is safe, and since when: "Saved 14:22 CET, here and on this device." */
function savedWords({ state, isKeptHere }: Pick<DraftSnapshot, 'state' | 'isKeptHere'>, savedAt: string): string {
  const here = isKeptHere ? 'Kept on this device' : 'Not kept yet';
  switch (state) {
    case 'saved':
      return `Saved ${savedAt}${isKeptHere ? ', here and on this device' : ''}. You can close the page and go on from your phone.`;
    case 'changed':
      return `${here}, saved in a moment.`;
    case 'saving':
      return 'Saving.';
    case 'offline':
      return `${here}; it is saved when the connection is back.`;
    case 'refused':
      return `${here}, not saved: see above the form.`;
    case 'conflict':
      return `${here}, not saved: choose a version first.`;
    case 'listed':
      return 'No longer a draft.';
  }
}

const shortWords: Partial<Record<DraftSnapshot['state'], string>> = {
  changed: 'Saved in a moment',
  saving: 'Saving',
};

/** The same in a word or two, for narrow screens. */
export function SavedNote() {
  const { state } = useDraft();
  const savedAt = useSavedAt();
  return state === 'saved' ? `Saved ${savedAt}` : (shortWords[state] ?? 'Not saved yet');
}

export function SavedLine() {
  return savedWords(useDraft(), useSavedAt());
}
