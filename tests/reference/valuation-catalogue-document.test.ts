import { catalogue20261, roundSignificant, type MaterialClass, type Parameter, type Quantity } from '@lydite/valuation';
import { format } from 'prettier';
import { expect, test } from 'vitest';
import { drawPlan } from '../../packages/valuation/src/lot/draw-plan.ts';
import { line } from '../../packages/valuation/src/lot/line.fixture.ts';
import { planLot } from '../../packages/valuation/src/lot/plan-lot.ts';
import { createQuantileFinder } from '../../packages/valuation/src/lot/quantile-finder.ts';

const figure = (value: number) => `${roundSignificant(value, 4)}`;

function inWords(quantity: Quantity): string {
  switch (quantity.kind) {
    case 'exact':
      return figure(quantity.value);
    case 'uniform':
      return `u(${figure(quantity.lo)}, ${figure(quantity.hi)})`;
    case 'lognormal':
      return `ln(${figure(quantity.median)}, ${figure(quantity.gsd)})`;
    case 'normal':
      return `normal(${figure(quantity.mean)}, ${figure(quantity.sd)})`;
    case 'triangular':
      return `triangular(${figure(quantity.lo)}, ${figure(quantity.mode)}, ${figure(quantity.hi)})`;
  }
}

const parametersOf = ({ components, pieceMassG }: MaterialClass): [string, Parameter][] => [
  ...components.flatMap(({ id, parameters }) =>
    Object.entries(parameters).map(([name, value]): [string, Parameter] => [`${id}.${name}`, value]),
  ),
  ...(pieceMassG ? [['pieceMassG', pieceMassG] as [string, Parameter]] : []),
];

/** p10 / p50 / p90 in g/t of the class alone: mass exact, no count, no doubt about what it is. */
function grades(classCode: string): string {
  const plan = planLot({ lines: [line({ classCode, massG: 1e6 })] }, catalogue20261);
  for (const { gold } of plan.lines) {
    for (const term of gold) term.factors = term.factors.filter(({ parameter }) => parameter !== 'identity');
  }
  const draws = 100_003;
  const { goldG } = drawPlan(plan, { seed: 1, draws });
  const quantiles = createQuantileFinder(draws)(goldG, [0.1, 0.5, 0.9]);
  return quantiles.map((gradeGPerT) => roundSignificant(gradeGPerT, 2)).join(' / ');
}

const sectionOf = (materialClass: MaterialClass) => `## ${materialClass.name} (\`${materialClass.code}\`)

${materialClass.hazards}

Gold, g/t, p10 / p50 / p90: ${grades(materialClass.code)}

| figure | value | source |
| --- | --- | --- |
${parametersOf(materialClass)
  .map(([name, { quantity, source }]) => `| \`${name}\` | ${inWords(quantity)} | ${source} |`)
  .join('\n')}
`;

// Written anew by `npx vitest run --project reference -u`; a change of the seed shows up here before anyone relies on it.
test('the catalogue’s document says what the seed says', async () => {
  const markdown = `# Catalogue of material classes ${catalogue20261.version}

ln(median, gsd) is lognormal, u(lo, hi) uniform, a bare number exact. Every spread is between lots: one draw holds for all
pieces of a class in a lot.

${catalogue20261.classes.map(sectionOf).join('\n')}`;
  const document = await format(markdown, { parser: 'markdown', singleQuote: true, printWidth: 120 });
  await expect(document).toMatchFileSnapshot('../../packages/valuation/catalogue-2026-1.md');
});
