import { existsSync, readFileSync } from 'node:fs';

const localDir = new URL('../../.local/', import.meta.url).pathname;

/** Where the stack under test is reached; by hand, the demo that `npm start` runs. */
export const addresses = {
  web: process.env.E2E_BASE_URL ?? 'http://localhost:4400',
  mail: process.env.E2E_MAIL_URL ?? 'http://localhost:4402',
  payments: process.env.E2E_PAYMENTS_URL ?? 'http://localhost:4401',
};

interface SignIn {
  role: 'seller' | 'buyer' | 'operator' | 'assayer';
  email: string;
  password: string;
}

/** The sign-in of the demo market for a role. */
export function demoSignIn(role: SignIn['role']): SignIn {
  const file = process.env.E2E_SIGN_INS_FILE ?? `${localDir}sign-ins.json`;
  if (!existsSync(file)) throw new Error(`There is no ${file}: the demo market was not seeded.`);
  const found = (JSON.parse(readFileSync(file, 'utf8')) as SignIn[]).find((one) => one.role === role);
  if (!found) throw new Error(`The demo market has no sign-in for the role "${role}".`);
  return found;
}
