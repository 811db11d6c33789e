import type { LotView, PublicLine, StoredEstimate } from '@lydite/contracts';
import { DoubtBar, formatNumber, NBSP, formatRange, formatShare, formatSignificant } from '@lydite/ui';
import { evidenceWords } from '../line-words.ts';
import { worthwhileMeasurements } from '../measurements.ts';

type Estimated = Pick<LotView, 'lines' | 'estimate' | 'massG' | 'pieces'>;

/** What the estimate rests on: the lines with how their figures are known, and what would narrow the range. */
export function EstimateParts({ lot }: { lot: Estimated }) {
  const { lines, estimate } = lot;
  return (
    <>
      <div className="table-scroll" role="region" aria-label="Lines of the estimate" tabIndex={0}>
        <table className="table">
          <thead>
            <tr>
              <th scope="col">Line</th>
              <th scope="col" className="r">
                Pieces
              </th>
              <th scope="col" className="r">
                Mass, kg
              </th>
              <th scope="col" className="r">
                Gold, g/t
              </th>
              <th scope="col" className="r">
                Gold, g
              </th>
              <th scope="col">Share of the doubt</th>
            </tr>
          </thead>
          <tbody>
            {lines.map((line, i) => (
              <LineRow key={line.id} line={line} number={i + 1} estimate={estimate} />
            ))}
          </tbody>
          {lines.length > 1 && <TotalRow lot={lot} />}
        </table>
      </div>
      <p className="tiny mute mt-2">Gold is the mean of all results; means add up, middles do not.</p>
      <Narrowing estimate={estimate} />
    </>
  );
}

const kilograms = (massG: number): string =>
  formatNumber(massG / 1000, { minimumFractionDigits: 1, maximumFractionDigits: 3 });
const gradeOf = (goldG: number, massG: number): string =>
  massG > 0 ? formatSignificant((goldG / massG) * 1e6, 2) : '–';

function LineRow({ line, number, estimate }: { line: PublicLine; number: number; estimate: StoredEstimate }) {
  const own = estimate.lines.find(({ id }) => id === line.id);
  if (!own) return null;
  return (
    <tr>
      <th scope="row">
        {number}. {line.label || line.className}
        <span className="line-evidence">{evidenceWords(line).join('. ')}</span>
      </th>
      <td className="r">{line.pieces === null ? '–' : formatNumber(line.pieces)}</td>
      <td className="r">{kilograms(own.massG)}</td>
      <td className="r">{gradeOf(own.goldG.mean, own.massG)}</td>
      <td className="r">{formatSignificant(own.goldG.mean, 2)}</td>
      <td>
        <DoubtBar share={own.varianceShare} />
      </td>
    </tr>
  );
}

function TotalRow({ lot: { estimate, pieces } }: { lot: Estimated }) {
  return (
    <tfoot>
      <tr>
        <th scope="row">Lot</th>
        <td className="r">{pieces === null ? '' : formatNumber(pieces)}</td>
        <td className="r">{kilograms(estimate.massG)}</td>
        <td className="r">{gradeOf(estimate.goldG.mean, estimate.massG)}</td>
        <td className="r">{formatSignificant(estimate.goldG.mean, 2)}</td>
        <td className="mute">100{NBSP}%</td>
      </tr>
    </tfoot>
  );
}

/** What the doubt comes from, largest first, and what would answer it; then what looks odd. */
function Narrowing({ estimate: { drivers, warnings } }: { estimate: StoredEstimate }) {
  const worthwhile = worthwhileMeasurements(drivers);
  if (worthwhile.length === 0 && warnings.length === 0) return null;
  return (
    <ul className="notes">
      {worthwhile.map(({ question, share, nowG, afterG }) => (
        <li key={question}>
          {question}: {formatShare(share, 0)} of the doubt. The range would go from {formatRange(nowG)} to about{' '}
          {formatRange(afterG)}.
        </li>
      ))}
      {warnings.map(({ code, lineId, message }) => (
        <li key={`${code} ${lineId}`}>{message}.</li>
      ))}
    </ul>
  );
}
