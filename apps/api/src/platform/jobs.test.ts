import { expect, test } from 'vitest';
import { runBatch } from './jobs.ts';

test('a job that fails is logged, keeps no other from running, and has the batch rung again', async () => {
  const ran: string[] = [];
  const failures: [unknown, string][] = [];
  const error = new Error('no such lot');
  const batch = runBatch({
    handler: async (objectId) => {
      if (objectId === 'b') throw error;
      ran.push(objectId);
    },
    objectIds: ['a', 'b', 'c'],
    onError: (...failure) => failures.push(failure),
  });
  await expect(batch).rejects.toThrow('1 of 3 jobs failed');
  expect(ran).toEqual(['a', 'c']);
  expect(failures).toEqual([[error, 'b']]);
});
