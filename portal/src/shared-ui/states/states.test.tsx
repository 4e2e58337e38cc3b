import { render, screen } from '@testing-library/react';
import { INSTRUMENT_STATES, STAGE_STATES, VERDICTS, type Verdict } from './state-words';
import { StageStateLine } from './state-line';
import { VerdictChip } from './verdict-chip';

describe('a verdict', () => {
  it('is said in the words of the trade, never as a failure', () => {
    expect(Object.values(VERDICTS).map(({ words }) => words)).toEqual([
      'Pass',
      'Too close to call',
      'Not yet',
    ]);
  });

  it('is short to the eye and full to the ear in a narrow place', () => {
    const { container } = render(<VerdictChip verdict="too close to call" narrow />);
    const [shown, read] = container.querySelectorAll('span > span');
    expect(shown).toHaveTextContent('Too close');
    expect(shown).toHaveAttribute('aria-hidden', 'true');
    expect(read).toHaveTextContent('Too close to call');
  });

  it.each(Object.keys(VERDICTS) as Verdict[])('%s carries a drawn shape beside its word', (verdict) => {
    const { container } = render(<VerdictChip verdict={verdict} />);
    expect(container.querySelector('svg')).toBeInTheDocument();
  });
});

describe('shapes decide, colour only helps', () => {
  it.each([
    ['verdicts', VERDICTS],
    ['stages', STAGE_STATES],
  ])('no two %s share a shape', (_group, looks) => {
    const shapes = Object.values(looks).map(({ shape }) => shape);
    expect(new Set(shapes).size).toBe(shapes.length);
  });

  it('an instrument that may not be used never has the shape of one that may', () => {
    const { ready, collected, ...others } = INSTRUMENT_STATES;
    expect(Object.values(others).map(({ shape }) => shape)).not.toContain(ready.shape);
    expect(collected.shape).not.toBe(ready.shape);
  });

  it('the words may say more than the state', () => {
    render(<StageStateLine state="on the bench">On the bench, 23 days</StageStateLine>);
    expect(screen.getByText('On the bench, 23 days')).toBeInTheDocument();
  });
});
