import argon2 from 'argon2';

/** OWASP's minimum for argon2id, set explicitly: the package's defaults are heavier and may change. */
export const argonParameters = { type: argon2.argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
const mostAtOnce = 4;

/** Refused outright, besides words of the member's own: the passwords everybody tries first. Lower case. */
const common = new Set(
  `password1234 passwordpassword 123456789012 1234567890123 qwertyuiop12 qwertyuiop[] 1q2w3e4r5t6y iloveyou1234 letmein12345 welcome12345
   administrator adminadmin12 changeme1234 abcdefghijkl abcd1234abcd 111111111111 000000000000 qwerty123456 password12345 passw0rd1234
   football1234 baseball1234 sunshine1234 princess1234 trustno1trustno1 monkey123456 dragon123456 superman1234 123123123123 1qaz2wsx3edc
   zaq12wsxcde3 asdfghjkl123 asdfghjklzxc qazwsxedcrfv michaelmichael whatever1234 starwars1234 computer1234 internet1234 goldgoldgold`
    .split(/\s+/)
    .filter(Boolean),
);

/** Why a password may not be used, in words with the fix; null when it may. */
export function weaknessOf(password: string, context: { email: string; name: string }): string | null {
  const plain = password.toLowerCase();
  if (common.has(plain) || /^(.)\1+$/.test(plain))
    return 'This is one of the passwords tried first. Choose several words that do not belong together.';
  const own = [context.email.split('@')[0]!, ...context.name.split(/\s+/), 'lydite']
    .map((word) => word.toLowerCase())
    .filter((word) => word.length >= 4);
  const rest = own.reduce((text, word) => text.replaceAll(word, ''), plain);
  if (rest.length < 6)
    return 'This is little more than your name, your address or the market’s. Add words nobody connects with you.';
  return null;
}

/**
 * Hashes and checks passwords, at most four at once: each takes 19 MiB while it runs. The pepper keeps a stolen table of
 * hashes useless without the settings.
 */
export function createPasswords({ pepper }: { pepper: string }) {
  const secret = Buffer.from(pepper);
  const waiting: (() => void)[] = [];
  let running = 0;

  async function inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (running >= mostAtOnce) await new Promise<void>((resolve) => waiting.push(resolve));
    running += 1;
    try {
      return await work();
    } finally {
      running -= 1;
      waiting.shift()?.();
    }
  }

  const hash = (password: string): Promise<string> =>
    inTurn(() => argon2.hash(password, { ...argonParameters, secret }));
  const dummy = hash('nobody’s password');
  dummy.catch(() => {});

  return {
    hash,
    /** Takes as long for an unknown member (`stored` null) as for a known one. */
    async verify(stored: string | null, password: string): Promise<boolean> {
      const right = await inTurn(async () => argon2.verify(stored ?? (await dummy), password, { secret }));
      return right && stored !== null;
    },
    needsRehash: (stored: string): boolean => argon2.needsRehash(stored, argonParameters),
  };
}
export type Passwords = ReturnType<typeof createPasswords>;
