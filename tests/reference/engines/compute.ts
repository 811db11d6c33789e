import {
  calibrate,
  catalogue20261,
  defaultAssaySale,
  defaultTerms,
  reserveAdvice,
  settleOnAssay,
  simulateLot,
  summariseLot,
  valueLot,
  valueOnAssay,
  type LineInput,
} from '@lydite/valuation';

const base: Omit<LineInput, 'id' | 'classCode'> = {
  identityEvidence: 'stated',
  massG: 4321,
  massEvidence: 'stated',
  scaleResolutionG: null,
  pieces: null,
  countEvidence: 'stated',
  plating: null,
  contactsPerPiece: null,
  padAreaMm2: null,
  areaCm2PerPiece: null,
  pieceMassG: null,
  wear: null,
  assay: null,
};

/** One line of every class in the catalogue, with evidence of every kind on some of them. */
const lines = catalogue20261.classes.map(({ code }, i): LineInput => {
  const evidence: Partial<LineInput>[] = [
    {},
    { massEvidence: 'weighed', scaleResolutionG: 5 },
    { plating: { kind: 'xrf', thicknessUm: 0.61 } },
    { pieces: 97, countEvidence: 'counted-on-photo' },
    { assay: { gradeGPerT: 412, relativeSd: 0.07 } },
  ];
  return { ...base, id: code, classCode: code, ...evidence[i % evidence.length] };
});

const market = { pricePerGMinor: 10_312.5 };

/** All that the valuation makes of one large lot, as plain JSON: what a browser shows and what a server freezes. */
export function compute(seed: number): unknown {
  const draws = simulateLot({ lines }, catalogue20261, { seed });
  const estimate = summariseLot(draws);
  const outright = valueLot(draws, defaultTerms, market);
  const onAssay = valueOnAssay(draws, defaultTerms, market, { ...defaultAssaySale, treatmentPerKgMinor: 40 });
  const bidMinor = outright.highestSafeBidMinor ?? 0;
  const shareBp = onAssay.highestSafeShareBp ?? 0;
  return {
    estimate,
    outright: [bidMinor, outright.profitQuantilesMinor(bidMinor), outright.steps(bidMinor)],
    breakEven: [outright.breakEvenGoldG(bidMinor), outright.breakEvenPricePerGMinor(bidMinor)],
    onAssay: [shareBp, onAssay.profitQuantilesMinor(shareBp), onAssay.breakEvenGoldG(shareBp)],
    advice: reserveAdvice({ draws, estimate, market, fees: { sellerFeeShare: 0.04, taxShare: 0, freightMinor: 0 } }),
    calibration: calibrate([
      { classCode: 'a', sellerId: 'x', logRatio: 0.21, sd: 0.3 },
      { classCode: 'a', sellerId: 'y', logRatio: -0.4, sd: 0.2 },
      { classCode: 'b', sellerId: 'y', logRatio: 0.13, sd: 0.25 },
    ]),
    settled: settleOnAssay({
      netMassG: '12400.125',
      gradeGPerT: 612.35,
      shareBp: 8250,
      minimumDeductionG: '0.1',
      pricePerGMinor: '12840.5',
      treatmentPerKgMinor: 250,
      refiningPerGMinor: 110,
    }),
  };
}
