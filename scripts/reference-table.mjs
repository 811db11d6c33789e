#!/usr/bin/env node
import { tsImport } from 'tsx/esm/api';
import { Refusal, runScript } from './lib/main.mjs';

const usage = `Prints every published value the valuation is held against: the value, ours, the difference and the source.
Fails when one is not met.

usage: npm run reference`;

await runScript({
  usage,
  async run() {
    const load = (file) => tsImport(`../tests/reference/published/${file}`, import.meta.url);
    const { publishedValues, publishedInside } = await load('published-values.ts');
    const { toleranceOf } = await load('published-value.ts');
    const rows = [
      ...publishedValues.map((value) => toRow(value, toleranceOf(value))),
      ...publishedInside.map(toInsideRow),
    ];
    print(rows);
    const missed = rows.filter(({ met }) => !met).length;
    console.log(`\n${rows.length} values, ${rows.length - missed} met, ${missed} missed`);
    if (missed > 0) throw new Refusal(`${missed} published values are not met; they are marked with an x.`);
  },
});

function toRow({ what, published, unit, source, ours }, tolerance) {
  const value = ours();
  const difference = value - Number(published);
  return {
    met: Math.abs(difference) <= tolerance,
    cells: [what, `${published} ${unit}`.trim(), figure(value), difference === 0 ? '0' : difference.toExponential(1)],
    source,
  };
}

function toInsideRow({ what, published, unit, source, range }) {
  const [low, high] = range();
  return {
    met: low < published && published < high,
    cells: [what, `${figure(published)} ${unit}`, `${figure(low)} … ${figure(high)}`, 'inside'],
    source,
  };
}

function figure(value) {
  return `${Number(value.toPrecision(9))}`;
}

function print(rows) {
  const heads = ['value', 'published', 'ours', 'difference'];
  const widths = heads.map((head, i) => Math.max(head.length, ...rows.map(({ cells }) => cells[i].length)));
  const line = (cells, end) => cells.map((cell, i) => cell.padEnd(widths[i] + 2)).join('') + end;
  console.log(`  ${line(heads, 'source')}`);
  for (const { met, cells, source } of rows) console.log(`${met ? ' ' : 'x'} ${line(cells, source)}`);
}
