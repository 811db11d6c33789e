import type { LineDraft } from '@lydite/contracts';
import { catalogue20261 as catalogue, type Warning } from '@lydite/valuation';
import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, expect, it } from 'vitest';
import { aLine } from '../../../lib/draft.fixture.ts';
import { useAcceptedChecks } from '../accepted-checks.ts';
import { emptyLine } from '../line-draft.ts';
import { LineForm } from './LineForm.tsx';

afterEach(() => {
  cleanup();
  sessionStorage.clear();
});

const heavy: Warning = {
  code: 'mass-per-piece',
  lineId: aLine().id,
  message: '33 kg for 160 pieces is 206 g each. Memory modules mostly weigh 13 to 37 g. 3.3 kg would be 20.6 g each.',
};

/** The form on a page that keeps the line, as the draft does. */
function show(start: LineDraft, warnings: Warning[] = []) {
  const now = { line: start };
  function Host() {
    const [line, setLine] = useState(start);
    const checks = useAcceptedChecks('L-2490');
    now.line = line;
    return (
      <LineForm
        index={0}
        line={line}
        lines={[line]}
        catalogue={catalogue}
        warnings={warnings}
        checks={checks}
        onChange={(change) => setLine((current) => ({ ...current, ...change }))}
      />
    );
  }
  render(<Host />);
  return { user: userEvent.setup(), line: () => now.line };
}

it('takes kind, pieces and mass as typed, unit and all', async () => {
  const { user, line } = show(emptyLine());
  await user.selectOptions(screen.getByLabelText('Kind'), 'Memory modules, gold contacts');
  await user.type(screen.getByLabelText('Pieces'), '1,940');
  await user.type(screen.getByLabelText('Mass, net'), '27 lb 5 oz');
  expect(line()).toMatchObject({ classCode: 'memory-modules', pieces: 1940, massText: '27 lb 5 oz', massUnit: 'lb' });
  expect(line().massG).toBeCloseTo(12_388.7, 0);
});

it('offers the likely mass, and takes it at one press', async () => {
  const { user, line } = show(aLine({ massG: 33_000, massText: '33', pieces: 160 }), [heavy]);
  await user.click(screen.getByRole('button', { name: /^Use 3.3/ }));
  expect(line()).toMatchObject({ massG: 3300, massText: '3.3', massUnit: 'kg' });
});

it('lets the typed mass stand, and asks again only about another one', async () => {
  const { user, line } = show(aLine({ massG: 33_000, massText: '33', pieces: 160 }), [heavy]);
  await user.click(screen.getByRole('button', { name: /is right$/ }));
  expect(line().massG).toBe(33_000);
  expect(screen.queryByRole('button', { name: /^Use/ })).toBeNull();
  await user.type(screen.getByLabelText('Pieces'), '1');
  expect(screen.queryByRole('button', { name: /is right$/ })).not.toBeNull();
});

it('asks for the scale once something is weighed, and forgets it otherwise', async () => {
  const { user, line } = show(aLine({ massEvidence: 'stated', scaleResolutionG: null }));
  expect(screen.queryByLabelText('Steps the scale shows')).toBeNull();
  await user.click(screen.getByRole('radio', { name: /^Weighed/ }));
  expect(line()).toMatchObject({ massEvidence: 'weighed', scaleResolutionG: 20 });
  await user.clear(screen.getByLabelText('Steps the scale shows'));
  await user.type(screen.getByLabelText('Steps the scale shows'), '0.1 kg');
  expect(line().scaleResolutionG).toBe(100);
  await user.click(screen.getByRole('radio', { name: /^Stated ?from papers/ }));
  expect(line()).toMatchObject({ massEvidence: 'stated', scaleResolutionG: null });
});

it('drops the pieces when they are not known', async () => {
  const { user, line } = show(aLine());
  await user.click(screen.getByRole('radio', { name: /^Not known mass only/ }));
  expect(line()).toMatchObject({ pieces: null, countEvidence: 'stated' });
});

it('reads plating in micro-inches, and only where the kind is plated', async () => {
  const { user, line } = show(aLine());
  await user.click(screen.getByRole('radio', { name: /^XRF reading/ }));
  await user.type(screen.getByLabelText('Thickness by XRF'), '30 µin');
  expect(line().plating).toMatchObject({ kind: 'xrf' });
  expect((line().plating as { thicknessUm: number }).thicknessUm).toBeCloseTo(0.762, 9);
  await user.selectOptions(screen.getByLabelText('Kind'), 'Mixed boards, unsorted');
  expect(screen.queryByText(/thickness of the gold plating/)).toBeNull();
});

it('refuses a thickness the market would not take, beside the field', async () => {
  const { user, line } = show(aLine());
  await user.click(screen.getByRole('radio', { name: /^XRF reading/ }));
  await user.type(screen.getByLabelText('Thickness by XRF'), '500 µm');
  expect(screen.getByText(/at most 100 µm/)).toBeTruthy();
  expect(line().plating).toBeNull();
});
