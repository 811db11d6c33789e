import { join } from 'node:path';
import sharp, { type Region } from 'sharp';
import { expect, test } from 'vitest';
import type { LotPlan } from './lot-plan.ts';
import { openBoards } from './lots/open-boards.ts';
import { openChips } from './lots/open-chips.ts';
import { openContacts } from './lots/open-contacts.ts';
import { sold } from './lots/sold.ts';
import { unsold } from './lots/unsold.ts';
import { readingOf, showReading } from './scale-reading.ts';
import { createCalendar } from './time.ts';

test('a reading is the gross mass with as many decimals as the scale has', () => {
  expect(readingOf({ netG: 1598, tareG: 105, resolutionG: 1 })).toBe('1.703');
  expect(readingOf({ netG: 15_090, tareG: 1240, resolutionG: 10 })).toBe('16.33');
  expect(readingOf({ netG: 14_340, tareG: 400, resolutionG: 100 })).toBe('14.7');
  expect(readingOf({ netG: 27_500, tareG: 700, resolutionG: 500 })).toBe('28.0');
});

const calendar = createCalendar({ now: new Date('2026-03-04T09:00:00Z'), zone: 'UTC' });
const plans: LotPlan[] = [
  ...[openBoards, openChips, openContacts].flatMap((lots) => lots(calendar)).map(({ plan }) => plan),
  ...Object.values<LotPlan>(sold),
  ...Object.values<LotPlan>(unsold),
];
const weighed = plans.flatMap(({ title, lines, photos }) =>
  photos.flatMap((photo) => ('weighing' in photo ? [{ title, lines, photo }] : [])),
);

test.each(weighed)('$title: the scale shows what the lot says', ({ lines, photo }) => {
  const { netG } = photo.weighing;
  const masses = lines.map(({ massG }) => massG ?? 0);
  const isPart = /^One of|part of the mass/.test(photo.description);
  if (isPart) expect(netG).toBeLessThan(masses.reduce((sum, massG) => sum + massG, 0));
  else expect(masses).toContain(netG);
  expect(netG).toBeLessThan(60_000);
  if (photo.file === 'memory-crate-scale') expect(lines.map(({ classCode }) => classCode)).toEqual(['memory-modules']);
});

test('the ticket of the public scale hangs on no lot: its masses are one weigh-in’s', () => {
  expect(plans.flatMap(({ photos }) => photos).filter(({ file }) => file === 'weigh-ticket')).toEqual([]);
});

test('digits are drawn on the display and nowhere else', async () => {
  const path = join(import.meta.dirname, 'photos', 'sack-floor-scale.jpg');
  const darkOn = async (photo: string | Buffer, area: Region) => {
    const { data } = await sharp(photo).extract(area).greyscale().raw().toBuffer({ resolveWithObject: true });
    return data.filter((grey) => grey < 80).length;
  };
  const shown = await showReading(path, 'sack-floor-scale', '88.88');
  const digits = { left: 960, top: 105, width: 220, height: 90 };
  expect(await darkOn(path, digits)).toBe(0);
  expect(await darkOn(shown, digits)).toBeGreaterThan(2500);
  const sack = { left: 200, top: 250, width: 600, height: 500 };
  expect(Math.abs((await darkOn(shown, sack)) - (await darkOn(path, sack)))).toBeLessThan(300);
});
