/**
 * Zod reads its settings from here when it loads, with the first form. Without this it tries out `new Function`, which the
 * content security policy reports. Importing zod to say so would put it into the entry chunk.
 */
export function keepZodFromEval(): void {
  Object.assign(globalThis, { __zod_globalConfig: { jitless: true } });
}
