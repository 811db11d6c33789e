import type { LineDraft } from '@lydite/contracts';
import { describe, expect, it } from 'vitest';
import { fromEntry, toEntry } from './plating-entry.ts';

describe('plating', () => {
  it.each<LineDraft['plating']>([
    null,
    { kind: 'standard', minimumUm: 0.762 },
    { kind: 'range', leastUm: 0.4, mostUm: 1.2 },
    { kind: 'xrf', thicknessUm: 0.71 },
  ])('comes back as it was saved: %o', (plating) => {
    expect(fromEntry(toEntry(plating))).toEqual(plating);
  });

  it('says nothing until it is whole', () => {
    const entry = toEntry(null);
    expect(fromEntry({ ...entry, known: 'range', leastUm: 0.4 })).toBeNull();
    expect(fromEntry({ ...entry, known: 'range', leastUm: 2, mostUm: 1 })).toBeNull();
    expect(fromEntry({ ...entry, known: 'standard' })).toBeNull();
    expect(fromEntry({ ...entry, known: 'xrf' })).toBeNull();
  });
});
