/** Seconds since `startMs` (of performance.now()), as "0.4 s" or "12 s". */
export function secondsSince(startMs) {
  const seconds = (performance.now() - startMs) / 1000;
  return `${seconds < 10 ? seconds.toFixed(1) : Math.round(seconds)} s`;
}

/**
 * Numbers the steps of a script and says how long each took: "3/9 Builds … done in 4.1 s".
 * A step's work may return a few words that replace "done".
 */
export function createSteps({ total, print = (text) => process.stdout.write(text) }) {
  let number = 0;
  return async function step(title, work) {
    number += 1;
    const startMs = performance.now();
    print(`${number}/${total} ${title} … `);
    try {
      const result = await work();
      const words = typeof result === 'string' ? result : 'done';
      print(`${words} in ${secondsSince(startMs)}\n`);
      return result;
    } catch (error) {
      print(`failed after ${secondsSince(startMs)}\n`);
      throw error;
    }
  };
}
