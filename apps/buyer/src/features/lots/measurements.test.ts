import { expect, it } from 'vitest';
import { worthwhileMeasurements } from './measurements.ts';

const driver = (parameter: string, share: number, question: string) => ({
  lineId: null,
  classCode: 'phone-boards',
  parameter,
  share,
  question,
  nowG: [5, 20] as [number, number],
  afterG: [9, 12] as [number, number],
});

it('asks each question once, with all it would answer, the most telling first', () => {
  const shown = worthwhileMeasurements([
    driver('plating.thicknessUm', 0.4, 'Measure the plating on line 1'),
    driver('grade.gradeGPerT', 0.3, 'Have a sample of line 1 assayed'),
    driver('assayed.share', 0.2, 'Have a sample of line 1 assayed'),
    driver('massG', 0.02, 'Weigh line 1'),
  ]);
  expect(shown.map(({ question, share }) => [question, share])).toEqual([
    ['Have a sample of line 1 assayed', 0.5],
    ['Measure the plating on line 1', 0.4],
  ]);
});
