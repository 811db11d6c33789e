import { LOCALE } from '@lydite/ui';
import { useDraft } from '../draft-context.tsx';
import type { DraftSnapshot } from '../draft-keeper.ts';

const clock = new Intl.DateTimeFormat(LOCALE, { hour: '2-digit', minute: '2-digit', hourCycle: 'h23' });

/** Where the draft is safe, and since when: "Saved 14:22, here and on this device." */
export function savedWords({ state, lot, isKeptHere }: Pick<DraftSnapshot, 'state' | 'lot' | 'isKeptHere'>): string {
  const here = isKeptHere ? 'Kept on this device' : 'Not kept yet';
  switch (state) {
    case 'saved':
      return `Saved ${clock.format(new Date(lot.savedAt))}${isKeptHere ? ', here and on this device' : ''}. You can close the page and go on from your phone.`;
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
  const { state, lot } = useDraft();
  return state === 'saved' ? `Saved ${clock.format(new Date(lot.savedAt))}` : (shortWords[state] ?? 'Not saved yet');
}

export function SavedLine() {
  return savedWords(useDraft());
}
