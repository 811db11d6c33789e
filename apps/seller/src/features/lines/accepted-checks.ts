import type { LineDraft } from '@lydite/contracts';
import { useState } from 'react';

type Figures = Pick<LineDraft, 'id' | 'massG' | 'pieces'>;

const nameOf = (lotCode: string, { id, massG, pieces }: Figures) => `check/${lotCode}/${id}/${massG}/${pieces}`;

export interface AcceptedChecks {
  isAccepted: (line: Figures) => boolean;
  accept: (line: Figures) => void;
}

/** Unlikely figures the seller has said are right. Another figure is asked about again. */
export function useAcceptedChecks(lotCode: string): AcceptedChecks {
  const [, setCount] = useState(0);
  return {
    isAccepted: (line) => sessionStorage.getItem(nameOf(lotCode, line)) !== null,
    accept: (line) => {
      sessionStorage.setItem(nameOf(lotCode, line), '1');
      setCount((count) => count + 1);
    },
  };
}
