import type { LotDraft, MissingItem } from '@lydite/contracts';
import { formatMassG, formatMoney } from '@lydite/ui';
import { counted } from '../../lib/counted.ts';

export const stepIds = ['photos', 'contents', 'weight', 'sale', 'check'] as const;
export type StepId = (typeof stepIds)[number];

export const stepNames: Record<StepId, string> = {
  photos: 'Photos',
  contents: 'Contents',
  weight: 'Weight',
  sale: 'Price and delivery',
  check: 'Check and list',
};

/** Where "Continue" leads, as its words. */
const continueWords: Record<StepId, string> = {
  photos: 'photos',
  contents: 'contents',
  weight: 'weight',
  sale: 'price and delivery',
  check: 'check and list',
};

/** The page after this one; null after the last. */
export function stepAfter(id: StepId): { id: StepId; label: string } | null {
  const next = stepIds[stepIds.indexOf(id) + 1];
  return next ? { id: next, label: `Continue to ${continueWords[next]}` } : null;
}

/** The page that a part of what is missing belongs to. */
export const stepOfPart = (part: MissingItem['part']): StepId => (part === 'declarations' ? 'check' : part);

export interface StepFacts {
  draft: LotDraft;
  missing: readonly MissingItem[];
  photoCount: number;
  /** Photos chosen but not sent yet. */
  waitingCount: number;
  /** Figures that look unlikely and were not confirmed. */
  checkCount: number;
  currency: string;
}

const notStarted = 'Not started';

/** The state of each page in a few words. */
export const stepNotes = (facts: StepFacts): Record<StepId, string> => ({
  photos: photosNote(facts),
  contents: contentsNote(facts),
  weight: weightNote(facts.draft),
  sale: saleNote(facts),
  check: checkNote(facts.missing),
});

function photosNote({ photoCount, waitingCount }: StepFacts): string {
  const parts = [photoCount > 0 && counted(photoCount, 'photo'), waitingCount > 0 && `${waitingCount} to send`];
  return parts.filter(Boolean).join(', ') || notStarted;
}

function contentsNote({ draft: { lines, title }, checkCount }: StepFacts): string {
  if (lines.length === 0) return title ? 'Title only' : notStarted;
  const unknown = lines.filter(({ classCode }) => classCode === null).length;
  const rest = unknown > 0 ? `, ${unknown} without a kind` : checkCount > 0 ? `, ${checkCount} to check` : '';
  return counted(lines.length, 'line') + rest;
}

function weightNote({ lines }: LotDraft): string {
  const known = lines.filter(({ massG }) => massG !== null);
  if (known.length === 0) return notStarted;
  if (known.length < lines.length) return `${known.length} of ${lines.length} lines`;
  const isWeighed = known.every(({ massEvidence }) => massEvidence === 'weighed');
  const massG = known.reduce((sum, line) => sum + (line.massG ?? 0), 0);
  return `${formatMassG(massG)}, ${isWeighed ? 'weighed' : 'not all weighed'}`;
}

function saleNote({ draft: { sale }, missing, currency }: StepFacts): string {
  const amountMinor = sale.form === 'asking-price' ? sale.askingMinor : sale.startMinor;
  if (amountMinor === null) return notStarted;
  const todo = missing.filter(({ part }) => part === 'sale').length;
  const amount = formatMoney(amountMinor, currency);
  const words = sale.form === 'asking-price' ? `${amount} asked` : `From ${amount}`;
  return todo > 0 ? `${words}, ${todo} to fill in` : `${words}, ${counted(sale.days, 'day')}`;
}

const checkNote = (missing: readonly MissingItem[]): string =>
  missing.length === 0 ? 'Ready to list' : `${counted(missing.length, 'thing')} missing`;
