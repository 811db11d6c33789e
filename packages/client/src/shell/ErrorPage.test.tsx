import { cleanup, render, screen } from '@testing-library/react';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiError } from '../call/api-error.ts';
import { ErrorPage } from './ErrorPage.tsx';

beforeEach(() => void vi.spyOn(console, 'error').mockReturnValue());
afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
});

function open(code: string, status: number) {
  const Broken = () => {
    throw new ApiError({ code, status, detail: 'lotCode: A lot code looks like L-2481.', fields: [], requestId: '' });
  };
  const router = createMemoryRouter([{ path: '/', Component: Broken, errorElement: <ErrorPage /> }]);
  render(<RouterProvider router={router} />);
  return screen.getByRole('heading').textContent;
}

describe('an address the market cannot show', () => {
  it('leads nowhere, whether it is unknown or no code at all', () => {
    expect(open('lot.not_found', 404)).toBe('There is nothing at this address');
    cleanup();
    expect(open('request.invalid', 400)).toBe('There is nothing at this address');
  });
  it('leads operators without a second step to where it is set up', () => {
    expect(open('session.totp_missing', 403)).toBe('Set up the second step first');
    expect(screen.getByRole('link', { name: 'Go to your account' }).getAttribute('href')).toBe('/account');
  });
  it('says otherwise what went wrong', () => {
    expect(open('internal', 500)).toBe('Something went wrong');
  });
});
