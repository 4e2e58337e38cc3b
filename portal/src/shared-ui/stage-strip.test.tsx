import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { StageStrip, type StripStage } from './stage-strip';

const STAGES: StripStage[] = [
  { id: 'a', number: 8, name: 'Mixer and band-pass', state: 'with mentor' },
  { id: 'b', number: 9, name: 'Pre-driver', state: 'on the bench' },
  { id: 'c', number: 12, name: 'On the air', state: 'locked' },
];

const strip = (onOpen: (id: string) => void = () => undefined) =>
  render(<StageStrip stages={STAGES} openId="b" onOpen={onOpen} label="Stages" />);

describe('the stage strip', () => {
  it('reads number, name and state of each stage', () => {
    strip();
    expect(screen.getAllByRole('tab').map((tab) => tab.getAttribute('aria-label'))).toEqual([
      'Stage 8, Mixer and band-pass, with mentor',
      'Stage 9, Pre-driver, on the bench',
      'Stage 12, On the air, locked',
    ]);
    expect(screen.getByRole('tab', { selected: true })).toHaveAccessibleName(/Pre-driver/);
  });

  it('is one tab stop, at the open stage; arrows, Home and End move, Enter opens', async () => {
    const user = userEvent.setup();
    const onOpen = vi.fn();
    strip(onOpen);
    await user.tab();
    expect(screen.getByRole('tab', { name: /Pre-driver/ })).toHaveFocus();
    await user.keyboard('{ArrowRight}{ArrowRight}');
    expect(screen.getByRole('tab', { name: /On the air/ })).toHaveFocus();
    await user.keyboard('{Home}{Enter}');
    expect(onOpen).toHaveBeenCalledExactlyOnceWith('a');
    await user.keyboard('{End}');
    expect(screen.getByRole('tab', { name: /On the air/ })).toHaveFocus();
  });

  it('opens a locked stage too, to say what unlocks it', async () => {
    const onOpen = vi.fn();
    strip(onOpen);
    await userEvent.click(screen.getByRole('tab', { name: /On the air/ }));
    expect(onOpen).toHaveBeenCalledWith('c');
  });
});
