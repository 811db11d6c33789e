import type { LotView } from '@lydite/contracts';
import { formatMassG } from '@lydite/ui';
import { Link } from 'react-router-dom';

/** Which lot a page is about, with the way to it. */
export function LotLine({ lot: { code, title, massG } }: { lot: Pick<LotView, 'code' | 'title' | 'massG'> }) {
  return (
    <p className="lead">
      <Link to={`/lots/${code}`}>{title}</Link>, <span className="mono">{code}</span>, {formatMassG(massG)}
    </p>
  );
}
