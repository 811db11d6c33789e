export interface AccountKind {
  /** Debit accounts grow by debits, credit accounts by credits. */
  normal: 'D' | 'C';
  /** The database refuses a balance below nought. */
  minZero: boolean;
}

const kinds: [pattern: RegExp, kind: AccountKind][] = [
  [/^asset\.(processor|bank)$/, { normal: 'D', minZero: false }],
  [/^receivable\.seller:./, { normal: 'D', minZero: false }],
  [/^suspense\.dispute:./, { normal: 'D', minZero: false }],
  [/^expense\.(processor_fee|dispute)$/, { normal: 'D', minZero: false }],
  [/^(hold\.deal|clearing\.refund|payable\.seller|payable\.assayer):./, { normal: 'C', minZero: true }],
  [/^liability\.tax$/, { normal: 'C', minZero: true }],
  [/^income\.fee$/, { normal: 'C', minZero: false }],
];

/** @throws RangeError for a code that money.md does not know: a typing error must not open an account */
export function kindOfAccount(code: string): AccountKind {
  const kind = kinds.find(([pattern]) => pattern.test(code))?.[1];
  if (!kind) throw new RangeError(`The ledger has no account of the kind ${code}`);
  return kind;
}

/** Every transaction locks these last, so that it holds them for the shortest time. */
const hotAccounts = ['income.fee', 'asset.processor'];

/** The one order in which transactions lock accounts, so that no two wait for each other. */
export const inLockOrder = <T extends { account: string }>(entries: T[]): T[] =>
  entries.toSorted(
    (a, b) =>
      hotAccounts.indexOf(a.account) - hotAccounts.indexOf(b.account) ||
      (a.account < b.account ? -1 : Number(a.account > b.account)),
  );
