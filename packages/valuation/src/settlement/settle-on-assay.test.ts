import fc from 'fast-check';
import { expect, test } from 'vitest';
import { fromGrams, massUnits, toGrams } from '../units/mass.ts';
import { compareAssays } from './compare-assays.ts';
import { divideHold } from './divide-hold.ts';
import { holdOnAssay } from './hold-on-assay.ts';
import { settleFineGold, settleOnAssay, type AssaySettlement } from './settle-on-assay.ts';

const example: AssaySettlement = {
  netMassG: 12_400,
  gradeGPerT: 612,
  shareBp: 8250,
  minimumDeductionG: '0.100',
  pricePerGMinor: 12_840,
  treatmentPerKgMinor: 250,
  refiningPerGMinor: 110,
};

/* The market's worked example: 12.400 kg, assays of 605 and 619 g/t, a payable share of 82.50 % at 128.40 a gram. */
test('the worked example, from two assays to the last cent', () => {
  const compared = compareAssays(605, 619, 0.08);
  expect(compared).toMatchObject({ meanGPerT: 612, differenceGPerT: 14, withinLimit: true });
  expect(compared.differenceShare).toBeCloseTo(0.0229, 4);
  const { valueMinor, steps } = settleOnAssay({ ...example, gradeGPerT: compared.meanGPerT });
  expect(Object.fromEntries(steps.map(({ key, value }) => [key, value]))).toEqual({
    netMass: '12400',
    grade: '612',
    fine: '7.5888',
    deduction: '0.1',
    share: '8250',
    payable: '6.17826',
    price: '12840',
    gross: '79328.8584',
    treatment: '3100',
    refining: '679.6086',
    value: '75549.2498',
  });
  expect(valueMinor).toBe(75_549);
  const divided = divideHold({
    valueMinor,
    freightMinor: 0,
    buyerFeeShare: 0.02,
    sellerFeeShare: 0.04,
    buyerTaxShare: 0,
    sellerTaxShare: 0,
    umpireBuyerMinor: 0,
    umpireSellerMinor: 0,
    buyerPaidInMinor: 90_500,
    sellerPaidInMinor: 0,
  });
  expect(divided).toMatchObject({
    sellerFeeMinor: 3022,
    sellerGetsMinor: 72_527,
    buyerFeeMinor: 1511,
    refundBuyerMinor: 13_440,
    secondPaymentMinor: 0,
  });
});

test('the value is the same whichever unit the mass was entered in', () => {
  fc.assert(
    fc.property(fc.integer({ min: 1, max: 10_000_000 }), fc.constantFrom(...massUnits), (milligrams, { id }) => {
      const netMassG = milligrams / 1000;
      // Entered in a unit, a mass is kept to the milligram, the finest the market keeps.
      const entered = Math.round(toGrams(fromGrams(netMassG, id), id) * 1000) / 1000;
      expect(settleOnAssay({ ...example, netMassG: entered })).toEqual(settleOnAssay({ ...example, netMassG }));
    }),
  );
});

test('gold from an estimate is valued by the same steps', () => {
  const { steps, valueMinor } = settleFineGold({ ...example, fineG: '7.5888' });
  expect(valueMinor).toBe(75_549);
  expect(steps.slice(1)).toEqual(settleOnAssay(example).steps.slice(2));
  expect(() => settleFineGold({ ...example, fineG: -1 })).toThrow('fineG');
});

test('the hold of a bid is what the buyer would owe at the frozen p75', () => {
  const fees = { buyerFeeShare: 0.02, buyerTaxShare: 0.1 };
  const hold = holdOnAssay({ ...example, fineG: 7.5888, freightMinor: 2500, ...fees });
  expect(hold).toEqual({ valueMinor: 75_549, freightMinor: 2500, feeMinor: 1511, taxMinor: 151, totalMinor: 79_711 });
});

test('digits from a database and numbers give the same', () => {
  expect(settleOnAssay({ ...example, netMassG: '12400.000', gradeGPerT: '612.0' }).valueMinor).toBe(75_549);
});

test('a value of half a cent is rounded to the even one', () => {
  const half = (pricePerGMinor: string) =>
    settleOnAssay({
      ...example,
      netMassG: 1000,
      gradeGPerT: 1000,
      shareBp: 10_000,
      minimumDeductionG: 0,
      treatmentPerKgMinor: 0,
      refiningPerGMinor: 0,
      pricePerGMinor,
    }).valueMinor;
  expect([half('10.5'), half('11.5'), half('11.4999')]).toEqual([10, 12, 11]);
});

test('rises with grade, share and price, and is never negative', () => {
  const grade = fc.integer({ min: 0, max: 5000 });
  fc.assert(
    fc.property(grade, grade, fc.integer({ min: 0, max: 10_000 }), (one, other, shareBp) => {
      const at = (gradeGPerT: number) => settleOnAssay({ ...example, gradeGPerT, shareBp }).valueMinor;
      expect(at(Math.max(one, other))).toBeGreaterThanOrEqual(at(Math.min(one, other)));
      expect(at(0)).toBe(0);
    }),
  );
});

test.each([
  [{ netMassG: -1 }, 'netMassG'],
  [{ gradeGPerT: 'much' }, 'gradeGPerT'],
  [{ shareBp: 10_001 }, 'shareBp'],
  [{ pricePerGMinor: Number.NaN }, 'pricePerGMinor'],
] as [Partial<AssaySettlement>, string][])('%o is refused by name', (given, name) => {
  expect(() => settleOnAssay({ ...example, ...given })).toThrow(new RegExp(`^${name} must be`));
});
