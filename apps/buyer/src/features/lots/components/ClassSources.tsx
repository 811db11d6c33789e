import type { PublicLine } from '@lydite/contracts';
import type { Catalogue, MaterialClass } from '@lydite/valuation';
import { componentWords, pieceMassWords, type ParameterWords } from '../parameter-words.ts';

interface ClassSourcesProps {
  lines: readonly PublicLine[];
  catalogue: Catalogue;
}

/** Where each figure of the lot's kinds comes from; evidence of a line replaces the figure it measures. */
export function ClassSources({ lines, catalogue }: ClassSourcesProps) {
  const codes = new Set(lines.map(({ classCode }) => classCode));
  const classes = catalogue.classes.filter(({ code }) => codes.has(code));
  return (
    <details className="lot-sources">
      <summary>Figures of the kinds, and where they come from</summary>
      <p className="small mute mt-2">
        Catalogue {catalogue.version}. What the seller weighed, counted or measured stands in place of these.
      </p>
      {classes.map((one) => (
        <ClassTable key={one.code} one={one} />
      ))}
    </details>
  );
}

function ClassTable({ one }: { one: MaterialClass }) {
  return (
    <table className="table">
      <caption>
        <b className="text-ink">{one.name}</b>
      </caption>
      <thead>
        <tr>
          <th scope="col">Figure</th>
          <th scope="col">Middle and spread</th>
          <th scope="col">Source</th>
        </tr>
      </thead>
      <tbody>
        {one.pieceMassG && <ParameterRow words={pieceMassWords(one.pieceMassG)} of="" />}
        {one.components.flatMap((component) =>
          componentWords(component).map((words) => <ParameterRow key={words.key} words={words} of={component.name} />),
        )}
      </tbody>
    </table>
  );
}

function ParameterRow({ words: { name, value, source }, of }: { words: ParameterWords; of: string }) {
  return (
    <tr>
      <th scope="row">
        {name}
        {of && <span className="mute">, {of}</span>}
      </th>
      <td>{value}</td>
      <td className="mute">{source}</td>
    </tr>
  );
}
