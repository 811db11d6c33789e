import { expect, test } from 'vitest';
import { z } from 'zod';
import { readInput } from './read-input.ts';

const schema = z.object({ lines: z.array(z.object({ label: z.string() })) });
const read = (label: string) => readInput(schema, { lines: [{ label: 'ok' }, { label }] }, 'body');

test.each([
  ['NUL', 'gold\0'],
  ['half of a pair', 'gold \uD83D'],
])('text with %s is refused by field, since no database keeps it', (_, label) => {
  expect(() => read(label)).toThrow(
    expect.objectContaining({ code: 'request.invalid', fields: [expect.objectContaining({ path: 'lines.1.label' })] }),
  );
});

test('whole characters of any plane are text', () => {
  expect(read('gold \u{1F600}')).toEqual({ lines: [{ label: 'ok' }, { label: 'gold \u{1F600}' }] });
});
