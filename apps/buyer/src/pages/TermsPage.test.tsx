import { cleanup, screen, waitFor } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { terms } from '../../test/market.ts';
import { renderPage } from '../../test/render-page.tsx';
import { Component } from './TermsPage.tsx';

afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const show = () =>
  renderPage({ Component, path: '/terms', at: '/terms?lot=L-2481' }, { 'PUT /my/terms': (body: unknown) => body });
const change = async (name: string, text: string) => {
  const field = await screen.findByRole('textbox', { name });
  await userEvent.clear(field);
  if (text) await userEvent.type(field, text);
};
const keep = () => userEvent.click(screen.getByRole('button', { name: 'Keep these terms' }));
const kept = ({ calls }: ReturnType<typeof show>) => calls.filter(({ route }) => route === 'PUT /my/terms');

describe('own terms', () => {
  it('keeps shares as shares and money as minor units, and leads back to the lot', async () => {
    const page = show();
    await change('Recovery yield', '88.5');
    await change('Cost per batch', '99.50');
    await userEvent.click(screen.getByRole('checkbox'));
    await keep();
    const link = await screen.findByRole('link', { name: 'Back to lot L-2481' });
    expect(link.getAttribute('href')).toBe('/lots/L-2481');
    expect(kept(page).map(({ body }) => body)).toEqual([
      { ...terms, recoveryYield: 0.885, batchCostMinor: 9950, curseOn: false },
    ]);
  });

  it.each([
    ['Recovery yield', '120', 'Enter the recovery yield, from 0 to 100 %'],
    ['Wanted chance of not losing money', '30', 'Enter the wanted chance, from 50 to 99 %'],
    ['Cost per kilogram', '', 'Enter the cost per kilogram, such as 2.50'],
  ])('refuses %s of "%s" in its own words, and sends nothing', async (name, text, words) => {
    const page = show();
    await change(name, text);
    await keep();
    await waitFor(() => expect(screen.getAllByText(words)).toHaveLength(2));
    expect(kept(page)).toEqual([]);
    expect(document.title).toMatch(/^Error: /);
  });
});
