import { NBSP } from '../text/characters.ts';
import { formatNumber } from '../text/format-number.ts';
import type { AssayMark } from './streak-types.ts';

interface AssayLabelsProps {
  axisMaxG: number;
  assays: readonly AssayMark[];
  names: Record<AssayMark['by'], string>;
  /** Largest agreed difference in grams; a wider gap is drawn as over the limit. */
  limitG: number | null;
}

const figure = (goldG: number) => formatNumber(goldG, { maximumFractionDigits: 2 });

/** Names under the ticks, and between two assays the bracket of their gap. */
export function AssayLabels({ axisMaxG, assays, names, limitG }: AssayLabelsProps) {
  const sorted = [...assays].sort((a, b) => a.goldG - b.goldG);
  const [low, high] = [sorted[0], sorted.at(-1)];
  const gapG = low && high ? high.goldG - low.goldG : 0;
  const left = (goldG: number) => `${(goldG / axisMaxG) * 100}%`;
  const side = (assay: AssayMark) =>
    sorted.length < 2 || (assay !== low && assay !== high) ? undefined : assay === low ? 'to-left' : 'to-right';
  return (
    <div className={limitG !== null && gapG > limitG ? 'assay-labels over-limit' : 'assay-labels'}>
      {low && high && gapG > 0 && sorted.length === 2 && (
        <>
          <i className="assay-gap" aria-hidden="true" style={{ left: left(low.goldG), width: left(gapG) }} />
          <span className="gap-figure" aria-hidden="true" style={{ left: left((low.goldG + high.goldG) / 2) }}>
            {figure(gapG)}
          </span>
        </>
      )}
      {sorted.map((assay) => (
        <span key={assay.by} className={side(assay)} style={{ left: left(assay.goldG) }}>
          <b>
            {names[assay.by]} {figure(assay.goldG)}
            {NBSP}g
          </b>
          {assay.plusMinusG !== null && (
            <>
              <br />±{NBSP}
              {figure(assay.plusMinusG)}
            </>
          )}
        </span>
      ))}
    </div>
  );
}
