/** Smallest of 1, 2, 5 × 10ⁿ minor units that is at least 0.8 % of an amount: one bid step (the market's rules, Bids). */
export function bidStepMinor(amountMinor: number): number {
  for (let decade = 1; ; decade *= 10)
    for (const digit of [1, 2, 5]) if (digit * decade * 1000 >= amountMinor * 8) return digit * decade;
}
