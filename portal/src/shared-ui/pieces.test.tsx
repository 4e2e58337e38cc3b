import { act, fireEvent, render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { CautionBox } from './caution-box';
import type { CautionKind } from './caution-symbols';
import { DataTable } from './data-table';
import { DockedDrawer } from './docked-drawer';
import { LoadingBars } from './loading-bars';
import { ProblemAlert } from './problem-alert';
import { ToastProvider, useToast } from './toasts';
import { WaitingButton } from './waiting-button';
import { WindowBar } from './window-bar';

describe('a caution', () => {
  it.each<[CautionKind, string]>([
    ['load before power', 'Load before power.'],
    ['hot parts', 'Hot parts.'],
    ['RF power', 'RF power.'],
    ['mains and high voltage', 'Mains and high voltage.'],
    ['RF exposure', 'RF exposure.'],
    ['licence needed', 'Licence needed.'],
  ])('%s says its name first and offers no way to dismiss it', (kind, name) => {
    render(<CautionBox kind={kind}>Fit the load first.</CautionBox>);
    const box = screen.getByRole('note', { name: `Caution: ${name}` });
    expect(box).toHaveTextContent(`${name} Fit the load first.`);
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });
});

describe('a failed request', () => {
  it('says what happened and tries again', async () => {
    const retry = vi.fn();
    const error = Object.assign(new Error(), {
      status: 500,
      title: 'Something went wrong',
      detail: 'Nothing was changed.',
    });
    render(<ProblemAlert error={error} onRetry={retry} />);
    expect(screen.getByRole('alert')).toHaveTextContent('Something went wrong. Nothing was changed.');
    await userEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(retry).toHaveBeenCalledOnce();
  });

  it('offers no second try where it cannot help', () => {
    const error = Object.assign(new Error(), {
      status: 403,
      title: 'Not allowed',
      detail: 'This is for mentors.',
    });
    render(<ProblemAlert error={error} onRetry={() => undefined} />);
    expect(screen.queryByRole('button')).not.toBeInTheDocument();
  });

  it('has words for a thing nobody planned', () => {
    render(<ProblemAlert error={new TypeError('x is undefined')} />);
    expect(screen.getByRole('alert')).not.toHaveTextContent('undefined');
  });
});

describe('a button that is not available yet', () => {
  it('can be focused and says what is missing', async () => {
    render(<WaitingButton reason="Checks 4, 5 and 6 are open.">Send to mentor, 3 checks left</WaitingButton>);
    const button = screen.getByRole('button', { name: 'Send to mentor, 3 checks left' });
    await userEvent.tab();
    expect(button).toHaveFocus();
    expect(button).toHaveAttribute('aria-disabled', 'true');
    expect(button).toHaveAccessibleDescription('Checks 4, 5 and 6 are open.');
    await userEvent.keyboard('{Enter}');
    expect(screen.getByRole('status')).toHaveTextContent('Checks 4, 5 and 6 are open.');
  });
});

describe('loading bars', () => {
  afterEach(() => vi.useRealTimers());

  it('wait 300 ms before they show', () => {
    vi.useFakeTimers();
    render(<LoadingBars label="Loading bookings" />);
    act(() => void vi.advanceTimersByTime(299));
    expect(screen.queryByText('Loading bookings')).not.toBeInTheDocument();
    act(() => void vi.advanceTimersByTime(1));
    expect(screen.getByText('Loading bookings')).toBeInTheDocument();
  });
});

function Opener() {
  const [open, setOpen] = useState(false);
  return (
    <>
      <button onClick={() => setOpen(true)}>Book a bench</button>
      <DockedDrawer open={open} title="Book a bench" onClose={() => setOpen(false)}>
        <input aria-label="From" />
      </DockedDrawer>
    </>
  );
}

describe('a docked drawer', () => {
  it('closes on Escape and gives the focus back to what opened it', async () => {
    render(<Opener />);
    await userEvent.click(screen.getByRole('button', { name: 'Book a bench' }));
    await userEvent.type(screen.getByLabelText('From'), '14:00');
    await userEvent.keyboard('{Escape}');
    expect(screen.queryByLabelText('From')).not.toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Book a bench' })).toHaveFocus();
  });
});

function Keeper({ undo }: { undo: () => void }) {
  const say = useToast();
  return <button onClick={() => say('Reading kept, +0.50 ± 0.39 dBm.', undo)}>Keep</button>;
}

describe('a toast', () => {
  it('says what was done and takes it back', async () => {
    const undo = vi.fn();
    render(
      <ToastProvider>
        <Keeper undo={undo} />
      </ToastProvider>,
    );
    await userEvent.click(screen.getByRole('button', { name: 'Keep' }));
    expect(screen.getByRole('status')).toHaveTextContent('Reading kept, +0.50 ± 0.39 dBm.');
    await userEvent.click(screen.getByRole('button', { name: 'Undo' }));
    expect(undo).toHaveBeenCalledOnce();
  });
});

describe('a table', () => {
  const columns = [
    { key: 'name', header: 'Person', cell: (row: { id: string; name: string }) => row.name },
    { key: 'dues', header: 'Dues', cell: () => '24.00', align: 'right' as const },
  ];

  it('names its rows, and opens one by its name', () => {
    const onOpen = vi.fn();
    const rows = [{ id: '1', name: 'Noor Ashby' }];
    render(
      <DataTable label="People" columns={columns} rows={rows} rowKey={(row) => row.id} onOpen={onOpen} />,
    );
    expect(screen.getByRole('table', { name: 'People' })).toBeInTheDocument();
    expect(screen.getByRole('rowheader', { name: 'Noor Ashby' })).toBeInTheDocument();
    fireEvent.click(screen.getByRole('button', { name: 'Noor Ashby' }));
    expect(onOpen).toHaveBeenCalledWith(rows[0]);
  });
});

describe('a window bar', () => {
  it('reads window and reading aloud', () => {
    render(<WindowBar low={0} high={3} reading={{ value: 0.37, expandedUncertainty: 0.47 }} unit="dBm" />);
    expect(screen.getByRole('img')).toHaveAccessibleName(
      'Window 0.0 to +3.0 dBm. Reading +0.37, plus or minus 0.47.',
    );
  });

  it('reads a window with one end', () => {
    render(<WindowBar high={-25} unit="dBc" />);
    expect(screen.getByRole('img')).toHaveAccessibleName('Window at most −25.0 dBc.');
  });
});
