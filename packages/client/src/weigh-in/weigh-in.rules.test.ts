import { describe, expect, it } from 'vitest';
import { differenceOf, netOf, toWeighInRequest, type WeighInEntries } from './weigh-in.rules.ts';

const mass = (value: number | null) => ({ text: String(value ?? ''), unit: 'g', value });
const entries = (gross: number | null, tare: number | null, resolution: number | null = 10): WeighInEntries => ({
  gross: mass(gross),
  tare: mass(tare),
  resolution: mass(resolution),
  scaleSerial: ' 4711 ',
  note: '',
});

describe('the net mass of a weigh-in', () => {
  it('is gross less tare, exact to the milligram', () => {
    expect(netOf(entries(412.5, 0.1))).toBe(412.4);
    expect(netOf(entries(86_900.2, 1_000.3))).toBe(85_899.9);
  });
  it('is not known until both are entered', () => {
    expect(netOf(entries(412.5, null))).toBeNull();
    expect(netOf(entries(null, 0))).toBeNull();
  });
  it('shows what is wrong when gross and tare are swapped', () => {
    expect(netOf(entries(100, 400))).toBe(-300);
  });
});

describe('the difference from the declared mass', () => {
  it('is within the tolerance up to half a per cent of the declared mass', () => {
    expect(differenceOf(entries(10_950, 1_000), 10_000)).toMatchObject({
      differenceG: -50,
      toleranceG: 50,
      withinTolerance: true,
      loss: 0,
    });
  });
  it('counts the whole shortage beyond the tolerance', () => {
    const found = differenceOf(entries(10_800, 1_000), 10_000);
    expect(found).toMatchObject({ differenceG: -200, withinTolerance: false });
    expect(found?.loss).toBeCloseTo(0.02, 12);
  });
  it('never asks more of a scale than twice what it can read', () => {
    expect(differenceOf(entries(10_900, 1_000, 100), 10_000)).toMatchObject({ toleranceG: 200, withinTolerance: true });
  });
  it('is not known without a net mass or a resolution', () => {
    expect(differenceOf(entries(10_900, 1_000, null), 10_000)).toBeNull();
    expect(differenceOf(entries(100, 400), 10_000)).toBeNull();
  });
});

describe('the request', () => {
  it('rounds converted figures to the milligram and trims words', () => {
    const request = toWeighInRequest(entries(27 * 453.59237, 0), ['8f0e7b1e-4a0a-4a57-9a7a-0d1d7f3e6a01']);
    expect(request.grossG).toBe(12_246.994);
    expect(request.scaleSerial).toBe('4711');
  });
  it('leaves a missing figure to be named by the schema', () => {
    expect(toWeighInRequest(entries(null, 0), []).grossG).toBeNaN();
  });
});
