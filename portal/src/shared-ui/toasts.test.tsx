import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useRef } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { ToastProvider, useToast } from './toasts';
import { TOAST_LIFT, useToastsAbove } from './use-toasts-above';

function Bar() {
  const bar = useRef<HTMLDivElement>(null);
  useToastsAbove(bar);
  const say = useToast();
  return (
    <div ref={bar}>
      <button onClick={() => say('Matched.')}>Match</button>
    </div>
  );
}

describe('a toast', () => {
  it('stands above a bar at the foot of the page, and comes down when the bar is gone', async () => {
    const height = vi.spyOn(HTMLElement.prototype, 'offsetHeight', 'get').mockReturnValue(66);
    const page = (hasBar: boolean) => <ToastProvider>{hasBar && <Bar />}</ToastProvider>;
    const { rerender } = render(page(true));
    await userEvent.click(screen.getByRole('button', { name: 'Match' }));
    expect(screen.getByText('Matched.')).toBeInTheDocument();
    const lift = () => document.documentElement.style.getPropertyValue(TOAST_LIFT);
    expect(lift()).toBe('66px');
    const css = [...document.querySelectorAll('style')].map(({ textContent }) => textContent).join('');
    expect(css).toContain(`calc(24px + min(var(${TOAST_LIFT}, 0px), 100dvh - 180px))`);
    rerender(page(false));
    expect(lift()).toBe('');
    height.mockRestore();
  });
});
