import {
  defaultTerms,
  expectedLargestNormal,
  fundamentalSamplingError,
  journalYield,
  keptShare,
  leastPieces,
  leastSampleMass,
  scores,
  settleOnAssay,
  shrink,
  valueLot,
  wilsonRange,
  type SettlementStepKey,
} from '@lydite/valuation';
import { battingAverages, restOfSeason } from './batting-averages.ts';
import type { PublishedValue } from './published-value.ts';

const harter = 'H. L. Harter, Biometrika 48 (1961) 151–165';
const chart = 'factor d₂ of control charts, ASTM MNL 7 (from memory): twice the expected largest';
const filing = 'payable share by grade, a public filing of a concentrate sale';
const wills = 'Wills’ Mineral Processing Technology, ch. 1 (from memory), recomputed';
const newcombe = 'R. G. Newcombe, Statistics in Medicine 17 (1998) 857–872, method 3 (from memory)';
const krejcie = 'R. V. Krejcie and D. W. Morgan 1970, table 1 (from memory): ±5 %, 95 %, P = 0.5';
const efron = 'B. Efron and C. Morris, Scientific American 236 (1977) 119–127';
const boundless = 1e15;

/** A tonne of a grade, paid by share without any deduction: grams payable. */
function payable(gradeGPerT: number, shareBp: number): number {
  const nothing = { minimumDeductionG: 0, pricePerGMinor: 0, treatmentPerKgMinor: 0, refiningPerGMinor: 0 };
  const { steps } = settleOnAssay({ netMassG: 1e6, gradeGPerT, shareBp, ...nothing });
  const key: SettlementStepKey = 'payable';
  return Number(steps.find((step) => step.key === key)?.value);
}

/** The textbook's tonne of copper ore, in hundredths: 0.6 %, 85 % recovered into 20.4 kg of concentrate of 25 %. */
function copperRows(): Record<string, number> {
  const concentrateG = 20_400;
  const one = { goldG: Float64Array.of(6000), massG: Float64Array.of(concentrateG) };
  const costless = { processingPerKgMinor: 0, batchCostMinor: 0, freightMinor: 0, assayCostMinor: 0 };
  const terms = {
    ...defaultTerms,
    ...costless,
    recoveryYield: 0.85,
    accountableShare: 1,
    minimumDeductionG: 0.01 * concentrateG,
    priceHaircut: 0,
    treatmentPerKgMinor: 3000,
    refiningPerGMinor: 11.5,
    annualCostOfMoney: 0,
    winnersCurse: false,
  };
  // Minor units here are thousandths of hundredths, so that rounding to whole ones leaves the printed digits.
  const { rows, profit } = valueLot(one, terms, { pricePerGMinor: 98 }).steps(0);
  const amount = (...keys: string[]) =>
    rows.filter(({ key }) => keys.includes(key)).reduce((sum, { amountMinor }) => sum + amountMinor, 0) / 1e5;
  return {
    payment: amount('contained', 'recovery', 'deduction'),
    treatment: -amount('treatment'),
    refining: -amount('refining'),
    net: profit.amountMinor / 1e5,
  };
}

const shrunkAverages = () => {
  const mean = battingAverages.reduce((sum, value) => sum + value, 0) / battingAverages.length;
  const sd = Math.sqrt((mean * (1 - mean)) / 45);
  return { mean, sd, kept: keptShare(battingAverages, sd) };
};
const squaredError = (guess: (average: number) => number) =>
  battingAverages.reduce((sum, average, i) => sum + (guess(average) - (restOfSeason[i] as number)) ** 2, 0);

export const marketValues: PublishedValue[] = [
  ...['0.56419', '0.84628', '1.02938', '1.16296', '1.26721', '1.35218', '1.42360', '1.48501', '1.53875'].map(
    (published, i): PublishedValue => ({
      what: `largest of ${i + 2} normals`,
      published,
      unit: '',
      source: harter,
      ours: () => expectedLargestNormal(i + 2),
    }),
  ),
  {
    what: 'largest of 20 normals',
    published: '1.86748',
    unit: '',
    source: `${harter} (from memory)`,
    ours: () => expectedLargestNormal(20),
  },
  {
    what: 'largest of 100 normals',
    published: '2.50759',
    unit: '',
    source: `${harter} (from memory)`,
    ours: () => expectedLargestNormal(100),
  },
  ...(
    [
      [2, '1.128'],
      [3, '1.693'],
      [4, '2.059'],
      [5, '2.326'],
      [10, '3.078'],
    ] as const
  ).map(([count, published]): PublishedValue => ({
    what: `range of ${count} normals`,
    published,
    unit: '',
    source: chart,
    ours: () => 2 * expectedLargestNormal(count),
  })),
  ...(
    [
      [25, 9100, '22.75'],
      [35, 9200, '32.20'],
      [80, 9600, '76.80'],
      [29.99, 9100, '27.29'],
      [30, 9200, '27.60'],
    ] as const
  ).map(([gradeGPerT, shareBp, published]): PublishedValue => ({
    what: `${gradeGPerT} g/t paid at ${shareBp / 100} %`,
    published,
    unit: 'g/t',
    source: filing,
    ours: () => payable(gradeGPerT, shareBp),
  })),
  ...(
    [
      ['payment', '4.798'],
      ['treatment', '0.612'],
      ['refining', '0.563'],
      ['net', '3.62'],
    ] as const
  ).map(([row, published]): PublishedValue => ({
    what: `copper ore, ${row}`,
    published,
    unit: '/t',
    source: wills,
    ours: () => copperRows()[row] as number,
  })),
  {
    what: 'sample for a fundamental error of 15 %, C = 22.5',
    published: '8',
    unit: 'g',
    source: 'ITRC ISM-1, d = 0.2 cm',
    ours: () => leastSampleMass({ d: 0.2, f: 1, g: 1, c: 22.5, l: 1, lotMassG: boundless, relativeSd: 0.15 }),
  },
  {
    what: 'sample for a fundamental error of 15 %, C = 200 000',
    published: '71',
    unit: 'kg',
    source: 'ITRC ISM-1, d = 0.2 cm',
    ours: () => leastSampleMass({ d: 0.2, f: 1, g: 1, c: 2e5, l: 1, lotMassG: boundless, relativeSd: 0.15 }) / 1000,
  },
  {
    what: 'fundamental error of 8 g',
    published: '0.15',
    unit: '',
    source: 'ITRC ISM-1, C = 22.5, d = 0.2 cm',
    ours: () => fundamentalSamplingError({ d: 0.2, f: 1, g: 1, c: 22.5, l: 1, lotMassG: boundless, sampleMassG: 8 }),
  },
  {
    what: 'sample of a 5 % ore at d = 2.5 cm',
    published: '1369632',
    unit: 'g',
    source: 'Wills’ example as a published worksheet: 95 %, 2 %, four stages, factor 2; C has five figures',
    ours: () =>
      2 * leastSampleMass({ d: 2.5, f: 1, g: 1, c: 1.1409, l: 1, lotMassG: boundless, relativeSd: 0.02 / 1.96 / 2 }),
    within: 70,
  },
  ...(
    [
      [100, '80'],
      [1000, '278'],
      [10_000, '370'],
    ] as const
  ).map(([of, published]): PublishedValue => ({
    what: `pieces to draw of ${of}`,
    published,
    unit: '',
    source: krejcie,
    ours: () => leastPieces({ cv: 1, relativeSd: 0.1 / 1.96, of }),
  })),
  {
    what: 'score of 1.006 against 1, σ = 0.00628',
    published: '0.955',
    unit: '',
    source: 'NIST Dataplot, GEAR run of ISO 13528: z',
    ours: () => scores({ value: 1.006, sd: 0.00628, reference: 1, referenceSd: 0 }).zeta,
  },
  {
    what: 'normalized error where zeta is 0.785',
    published: '0.393',
    unit: '',
    source: 'NIST Dataplot, GEAR run of ISO 13528: E_n, with k = 2; zeta is printed to three digits',
    ours: () => scores({ value: 1.006, sd: 0.006 / 0.785, reference: 1, referenceSd: 0 }).normalizedError,
    within: 0.00076,
  },
  {
    what: 'prior 250 ± 100, assay 340 ± 50: mean',
    published: '322.0',
    unit: 'g/t',
    source: 'normal–normal, recomputed',
    ours: () => shrink({ mean: 250, sd: 100 }, { mean: 340, sd: 50 }).mean,
  },
  {
    what: 'prior 250 ± 100, assay 340 ± 50: sd',
    published: '44.72',
    unit: 'g/t',
    source: 'normal–normal, recomputed',
    ours: () => shrink({ mean: 250, sd: 100 }, { mean: 340, sd: 50 }).sd,
  },
  {
    what: 'eighteen batting averages, mean',
    published: '0.265',
    unit: '',
    source: efron,
    ours: () => shrunkAverages().mean,
  },
  {
    what: 'eighteen batting averages, share kept',
    published: '0.212',
    unit: '',
    source: efron,
    ours: () => shrunkAverages().kept,
  },
  {
    what: 'batting averages, error over error of the shrunk',
    published: '3.5',
    unit: '',
    source: efron,
    ours: () => {
      const { mean, sd, kept } = shrunkAverages();
      const prior = { mean, sd: sd * Math.sqrt(kept / (1 - kept)) };
      return squaredError((average) => average) / squaredError((average) => shrink(prior, { mean: average, sd }).mean);
    },
  },
  {
    what: '437 girls of 980 births, posterior mean',
    published: '0.446',
    unit: '',
    source: 'A. Gelman et al., Bayesian Data Analysis, section 2.4 (from memory), uniform prior',
    ours: () =>
      journalYield({ yield: 0.5, sd: Math.sqrt(1 / 12), effectiveG: 2 }, [{ containedG: 980, recoveredG: 437 }]).yield,
  },
  {
    what: '437 girls of 980 births, posterior sd',
    published: '0.016',
    unit: '',
    source: 'A. Gelman et al., Bayesian Data Analysis, section 2.4 (from memory), uniform prior',
    ours: () =>
      journalYield({ yield: 0.5, sd: Math.sqrt(1 / 12), effectiveG: 2 }, [{ containedG: 980, recoveredG: 437 }]).sd,
  },
  ...(
    [
      [81, 263, '0.2553', '0.3662'],
      [15, 148, '0.0624', '0.1605'],
      [0, 20, '0.0000', '0.1611'],
      [1, 29, '0.0061', '0.1718'],
    ] as const
  ).flatMap(([hits, trials, low, high]): PublishedValue[] => [
    {
      what: `95 % range of ${hits} in ${trials}, low`,
      published: low,
      unit: '',
      source: newcombe,
      ours: () => wilsonRange(hits, trials)[0],
    },
    {
      what: `95 % range of ${hits} in ${trials}, high`,
      published: high,
      unit: '',
      source: newcombe,
      ours: () => wilsonRange(hits, trials)[1],
    },
  ]),
];
