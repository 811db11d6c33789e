import { expect, it } from 'vitest';
import { savedAtWords } from './components/SavedLine.tsx';

const zone = 'Europe/Berlin';
const now = new Date('2026-12-01T11:27:00Z');

it('tells a draft saved today by its time, an older one by its date too', () => {
  expect(savedAtWords('2026-12-01T10:40:00Z', now, zone)).toBe('11:40 CET');
  expect(savedAtWords('2026-11-30T23:30:00Z', now, zone)).toBe('00:30 CET');
  expect(savedAtWords('2026-11-30T16:05:00Z', now, zone)).toBe('30 Nov, 17:05 CET');
});
