import { expect, test } from 'vitest';
import { createPasswords, weaknessOf } from './passwords.ts';

const context = { email: 'thrennaby@members.example', name: 'Thrennaby Repairs' };

test.each(['Password1234', '111111111111', 'thrennaby123', 'Lydite-thrennaby!'])('%s is refused', (password) => {
  expect(weaknessOf(password, context)).not.toBeNull();
});

test('several unconnected words pass, spaces and any script included', () => {
  expect(weaknessOf('copper lantern sundial', context)).toBeNull();
  expect(weaknessOf('тихая лампа и ложка', context)).toBeNull();
});

test('hashes carry the parameters of the documentation, differ each time, and want the pepper', async () => {
  const passwords = createPasswords({ pepper: 'a pepper of the tests, long enough' });
  const stored = await passwords.hash('copper lantern sundial');
  expect(stored).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  expect(await passwords.verify(stored, 'copper lantern sundial')).toBe(true);
  expect(await passwords.verify(stored, 'copper lantern sundial ')).toBe(false);
  expect(await passwords.verify(null, 'nobody’s password')).toBe(false);
  const other = createPasswords({ pepper: 'another pepper of the tests, as long' });
  expect(await other.verify(stored, 'copper lantern sundial')).toBe(false);
});

test('a burst of hashes is worked off four at a time', async () => {
  const passwords = createPasswords({ pepper: 'a pepper of the tests, long enough' });
  const all = await Promise.all(Array.from({ length: 9 }, (_, i) => passwords.hash(`copper lantern ${i}`)));
  expect(new Set(all).size).toBe(9);
});
