import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useForm } from 'react-hook-form';
import { dropDraft, keepDraft, readDraft } from '../lib/drafts';
import { DraftOwner } from './draft-owner';
import { FormText } from './form/form-fields';
import { useDraft } from './use-draft';
import { useFormDraft } from './use-form-draft';

function Note({ place = 'note:1' }: { place?: string }) {
  const draft = useDraft(place, '');
  return (
    <>
      <input aria-label="Note" value={draft.value} onChange={(event) => draft.setValue(event.target.value)} />
      <p>{draft.keptFrom ?? 'nothing kept'}</p>
      <button onClick={draft.drop}>Sent</button>
    </>
  );
}

function Booking() {
  const form = useForm({ defaultValues: { from: '', to: '' } });
  const draft = useFormDraft(form, 'booking:2026-10-17');
  return (
    <form>
      <FormText control={form.control} name="from" label="From" />
      <FormText control={form.control} name="to" label="To" />
      <p>{draft.keptFrom ?? 'nothing kept'}</p>
    </form>
  );
}

const as = (person: string, page: React.ReactNode) => render(<DraftOwner value={person}>{page}</DraftOwner>);

describe('what was typed', () => {
  it('comes back after the page was left, and says from when', async () => {
    const first = as('tamsin', <Note />);
    await userEvent.type(screen.getByLabelText('Note'), 'scope at x10');
    first.unmount();
    as('tamsin', <Note />);
    expect(screen.getByLabelText('Note')).toHaveValue('scope at x10');
    expect(screen.getByText(/^Kept from \d\d:\d\d$/)).toBeInTheDocument();
  });

  it('is another person’s on a shared device', () => {
    keepDraft('tamsin', 'note:1', 'mine');
    as('marek', <Note />);
    expect(screen.getByLabelText('Note')).toHaveValue('');
  });

  it('is forgotten once it was sent', async () => {
    keepDraft('tamsin', 'note:1', 'ready');
    as('tamsin', <Note />);
    await userEvent.click(screen.getByRole('button', { name: 'Sent' }));
    expect(screen.getByText('nothing kept')).toBeInTheDocument();
    expect(readDraft('tamsin', 'note:1')).toBeUndefined();
  });

  it('survives in a whole form', async () => {
    const first = as('tamsin', <Booking />);
    await userEvent.type(screen.getByLabelText('From'), '14:00');
    await userEvent.type(screen.getByLabelText('To'), '16:30');
    first.unmount();
    as('tamsin', <Booking />);
    expect(screen.getByLabelText('From')).toHaveValue('14:00');
    expect(screen.getByLabelText('To')).toHaveValue('16:30');
    expect(screen.getByText(/^Kept from/)).toBeInTheDocument();
  });

  it('is not kept for a form nobody has typed in', () => {
    as('tamsin', <Booking />);
    expect(localStorage).toHaveLength(0);
  });

  it('does not break the page when the device holds rubbish', () => {
    localStorage.setItem('ferrite-draft:tamsin:note:1', '{not json');
    expect(readDraft('tamsin', 'note:1')).toBeUndefined();
    dropDraft('tamsin', 'note:1');
  });
});
