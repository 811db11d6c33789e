import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { afterEach, describe, expect, it } from 'vitest';
import { goldAt } from './streak-axis.ts';
import { lognormalEstimate } from './streak-fixtures.ts';
import { Streak } from './Streak.tsx';
import { StreakCell } from './StreakCell.tsx';

afterEach(cleanup);
const user = userEvent.setup();
const estimate = lognormalEstimate(64, 0.2);
const money = { currency: 'USD', atZeroMinor: -36_300, perGMinor: 12_369 };

function Movable() {
  const [amountMinor, setAmount] = useState(620_000);
  const bid = { amountMinor, breakEvenG: goldAt(amountMinor, money), resultPerGMinor: 12_369 };
  const move = { stepMinor: 5000, leastMinor: 10_000, mostMinor: 1_000_000, onMove: setAmount };
  return (
    <Streak
      subject="lot L-2481"
      heading="Gold"
      estimate={estimate}
      money={money}
      bid={bid}
      move={move}
      pricePerGMinor={13_020}
    />
  );
}

describe('the streak', () => {
  it('is an image with a name, a description and the sentence beside it', () => {
    render(<Movable />);
    const image = screen.getByRole('img', { name: 'Estimated fine gold in lot L-2481' });
    expect(image.querySelector('desc')?.textContent).toMatch(/^Eight results in ten lie between 50 and 83.g\./);
    expect(image.querySelectorAll('.streak-beads circle')).toHaveLength(50);
    expect(screen.getByText('41 of 50')).toBeTruthy();
  });

  it('moves the bid by keys and says what that does', async () => {
    render(<Movable />);
    const slider = screen.getByRole('slider', { name: 'Your bid' });
    expect(slider.getAttribute('aria-valuetext')).toBe('6,200 US dollars, ahead in 41 of 50');
    slider.focus();
    await user.keyboard('{ArrowRight}');
    expect(slider.getAttribute('aria-valuenow')).toBe('6250');
    await user.keyboard('{Home}');
    expect(slider.getAttribute('aria-valuetext')).toBe('100 US dollars, ahead in 50 of 50');
    await user.keyboard('{ArrowLeft}');
    expect(slider.getAttribute('aria-valuenow')).toBe('100');
  });

  it('shows the same figures as a table', async () => {
    render(<Movable />);
    await user.click(screen.getByRole('button', { name: 'Table' }));
    const middle = screen.getByRole('row', { name: /^Middle/ });
    expect(
      within(middle)
        .getAllByRole('cell')
        .map(({ textContent }) => textContent),
    ).toEqual(['64', '2.1', '$8,330', '+$1,350']);
    expect(screen.queryByRole('img')).toBeNull();
    await user.click(screen.getByRole('button', { name: 'Streak' }));
    expect(screen.getByRole('img')).toBeTruthy();
  });

  it('shows no table and no beads before there is an estimate', () => {
    render(<Streak subject="this draft" estimate={null} />);
    expect(screen.queryByRole('button', { name: 'Table' })).toBeNull();
    expect(screen.getByText('Not yet estimated.', { selector: 'p' })).toBeTruthy();
  });
});

describe('the list’s cell', () => {
  it('reads as grade and tells both bids', () => {
    render(<StreakCell subject="lot L-2481" estimate={estimate} breakEvenG={38.5} leadBreakEvenG={51} />);
    const image = screen.getByRole('img', { name: 'Grade of lot L-2481' });
    expect(image.querySelector('desc')?.textContent).toBe(
      '570 to 960 grams of gold per tonne in 8 results of 10. Your bid breaks even at 450. The highest bid of another buyer breaks even at 590.',
    );
  });
});
