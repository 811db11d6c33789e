import { cleanup, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { Button } from './Button.tsx';

afterEach(cleanup);

describe('a double press', () => {
  it('sends once, before the button is busy', async () => {
    const send = vi.fn<() => void>();
    render(
      <Button busy={false} onClick={send}>
        Send
      </Button>,
    );
    await userEvent.dblClick(screen.getByRole('button'));
    expect(send).toHaveBeenCalledTimes(1);
  });
  it('submits a form once', async () => {
    const send = vi.fn<(event: React.FormEvent) => void>((event) => event.preventDefault());
    render(
      <form onSubmit={send}>
        <Button type="submit" busy={false}>
          Send
        </Button>
      </form>,
    );
    await userEvent.dblClick(screen.getByRole('button'));
    expect(send).toHaveBeenCalledTimes(1);
  });
  it('counts twice on a button that sends nothing', async () => {
    const step = vi.fn<() => void>();
    render(<Button onClick={step}>More</Button>);
    await userEvent.dblClick(screen.getByRole('button'));
    expect(step).toHaveBeenCalledTimes(2);
  });
});
