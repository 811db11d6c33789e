import { cleanup, render, screen } from '@testing-library/react';
import { afterEach, describe, expect, it } from 'vitest';
import { ChainRail, ChainSteps } from './ChainRail.tsx';
import type { ChainStep } from './chain-types.ts';

afterEach(cleanup);
const steps: ChainStep[] = [
  { name: 'Listed', note: '12 Nov', state: 'done' },
  { name: 'Bidding', note: 'Closes 4 Dec', state: 'now' },
  { name: 'Settlement', state: 'todo' },
];

describe('the chain', () => {
  it('marks the step that is under way and says each state', () => {
    render(<ChainRail code="L-2481" steps={steps} />);
    const items = screen.getAllByRole('listitem');
    expect(items.map((item) => item.querySelector('strong')?.textContent)).toEqual([
      'Done: Listed',
      'Now: Bidding',
      'To come: Settlement',
    ]);
    expect(items.map((item) => item.getAttribute('aria-current'))).toEqual([null, 'step', null]);
  });
  it('is one line on phones', () => {
    const { container } = render(<ChainSteps code="L-2481" steps={steps} aside="Closes Thu" />);
    expect(container.querySelector('summary')?.textContent).toBe('Bidding, step 2 of 3Closes Thu');
  });
  it('counts the last step when all is done', () => {
    const done = steps.map((step) => ({ ...step, state: 'done' as const }));
    const { container } = render(<ChainSteps code="L-2481" steps={done} />);
    expect(container.querySelector('summary')?.textContent).toBe('Settlement, step 3 of 3');
  });
});
