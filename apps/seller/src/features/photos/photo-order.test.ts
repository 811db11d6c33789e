import type { PhotoView } from '@lydite/contracts';
import { expect, it } from 'vitest';
import { described, moved, retaken } from './photo-order.ts';

const photo = (id: string, description = '', slot: PhotoView['slot'] = 'whole'): PhotoView => ({
  id,
  slot,
  description,
  width: 4,
  height: 3,
  colour: '#333',
});
const ids = (photos: readonly PhotoView[]) => photos.map(({ id }) => id).join('');
const all = [photo('a'), photo('b'), photo('c')];

it('moves a photo by one place and stops at the ends', () => {
  expect(ids(moved(all, 'c', -1))).toBe('acb');
  expect(ids(moved(all, 'a', 1))).toBe('bac');
  expect(ids(moved(all, 'a', -1))).toBe('abc');
  expect(ids(moved(all, 'c', 1))).toBe('abc');
});

it('puts a photo taken anew where the old one stood, with its description', () => {
  const order = retaken([photo('a', 'Cover'), photo('b')], photo('x'), 'a');
  expect(ids(order)).toBe('xb');
  expect(order[0]!.description).toBe('Cover');
  expect(ids(retaken(all, photo('x'), 'gone'))).toBe('abcx');
});

it('gives photos the caption of their shot until the seller writes one', () => {
  const [own, preset, other] = described([photo('a', 'Mine'), photo('b'), photo('c', '', 'other')]);
  expect(own!.description).toBe('Mine');
  expect(preset!.description).toBe('The whole lot from above, with a ruler');
  expect(other!.description).toBe('');
});
