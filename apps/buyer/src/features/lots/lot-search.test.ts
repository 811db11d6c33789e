import { describe, expect, it } from 'vitest';
import { filtersOn, lotSearch, readLotSearch, viewOf } from './lot-search.ts';

const read = (text: string) => readLotSearch(new URLSearchParams(text));

describe('the list in an address', () => {
  it('reads filters, order and page', () => {
    expect(read('goldG=10&closing=week&sort=-gold&page=3')).toEqual({
      goldG: 10,
      closing: 'week',
      sort: '-gold',
      page: 3,
    });
  });

  it('leaves out what it cannot read and keeps the rest', () => {
    expect(read('goldG=much&form=raffle&colour=red&massKg=50')).toEqual({ massKg: 50, sort: 'closes', page: 1 });
  });

  it('writes nothing for what goes without saying', () => {
    expect(lotSearch(read(''), {})).toBe('');
    expect(lotSearch(read('page=4&goldG=10'), { page: 1, goldG: undefined })).toBe('');
  });

  it('goes back to the first page when anything else changes', () => {
    expect(lotSearch(read('page=4&goldG=10'), { sort: '-mass' })).toBe('?goldG=10&sort=-mass');
    expect(lotSearch(read('page=4&goldG=10'), { page: 5 })).toBe('?goldG=10&page=5');
  });

  it('survives the way through an address', () => {
    const query = read('q=memory+L-24&class=phone-boards&mine=bid&sort=price&page=2');
    expect(readLotSearch(new URLSearchParams(lotSearch(query, { page: query.page })))).toEqual(query);
  });

  it('names the view whose filters are exactly those', () => {
    expect(viewOf(read('sort=-gold'))?.key).toBe('all');
    expect(viewOf(read('goldG=10'))?.key).toBe('over-10-g');
    expect(viewOf(read('goldG=10&massKg=50'))).toBeUndefined();
  });

  it('counts the filters that are on, not order and search', () => {
    expect(filtersOn(read('goldG=10&mine=bid&q=memory&sort=-gold'))).toEqual(['goldG', 'mine']);
  });
});
