import { fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { signed } from '../../lib/text';
import { LevelDiagram } from './level-diagram';
import type { LevelBeingEntered, LevelPoint } from './level-point';
import { levelRows } from './level-rows';
import { differenceToY, levelToY, PLOT, rangeOf, STRIP } from './level-scale';
import { powerLabel, spokenRow, twoLines } from './level-words';

const POINTS: LevelPoint[] = [
  {
    id: 'mixer',
    stageNumber: 8,
    name: 'Mixer',
    planDbm: -16.5,
    toleranceDb: 2,
    limitDbm: -6,
    measured: { levelDbm: -16.4, expandedUncertaintyDb: 0.4 },
    verdict: 'pass',
  },
  {
    id: 'bpf',
    stageNumber: 8,
    name: 'Band-pass filter',
    planDbm: -19,
    toleranceDb: 1.5,
    measured: { levelDbm: -19.4, expandedUncertaintyDb: 0.5, isWithMentor: true },
    verdict: 'pass',
  },
  { id: 'pre', stageNumber: 9, name: 'Pre-driver', planDbm: 1.5, toleranceDb: 1.5, limitDbm: 10 },
];
const ENTERED: LevelBeingEntered = {
  pointId: 'pre',
  levelDbm: 0.37,
  expandedUncertaintyDb: 0.47,
  verdict: 'too close to call',
};

describe('rows of the level diagram', () => {
  it('take gains from neighbours, headroom from plan to limit, and the reading being entered', () => {
    const [mixer, filter, driver] = levelRows(POINTS, ENTERED);
    expect(mixer).toMatchObject({ gainPlannedDb: undefined, headroomDb: 10.5, isHeadroomLow: false });
    expect(filter?.gainPlannedDb).toBeCloseTo(-2.5);
    expect(filter?.gainMeasuredDb).toBeCloseTo(-3);
    expect(filter?.headroomDb).toBeUndefined();
    expect(driver).toMatchObject({ isBeingEntered: true, verdict: 'too close to call' });
    expect(driver?.gainMeasuredDb).toBeCloseTo(19.77);
    expect(driver?.offPlanDb).toBeCloseTo(-1.13);
  });

  it('call headroom low below 1 dB, by the level that was measured', () => {
    const hot = { ...POINTS[2], measured: { levelDbm: 9.2, expandedUncertaintyDb: 0.4 } } as LevelPoint;
    expect(levelRows([hot])[0]).toMatchObject({ headroomDb: 8.5, isHeadroomLow: true });
  });

  it('are read out as one sentence for each stage', () => {
    const [, filter] = levelRows(POINTS);
    expect(spokenRow(filter as never)).toBe(
      'Band-pass filter. Planned −19.0, plus or minus 1.5. Measured −19.4, plus or minus 0.5. Gain −3.0, planned −2.5. No limit. Pass.',
    );
  });
});

describe('scales of the level diagram', () => {
  it('run from the lowest tolerance, down to the grid, to 5 dB over the highest limit, up to the grid', () => {
    const range = rangeOf(levelRows(POINTS));
    expect(range).toEqual({ lowDbm: -30, highDbm: 20 });
    expect(levelToY(range)(20)).toBe(PLOT.top);
    expect(levelToY(range)(-30)).toBe(PLOT.bottom);
  });

  it('widen for a reading outside of them instead of losing it', () => {
    const wild = { ...ENTERED, levelDbm: 33 };
    expect(rangeOf(levelRows(POINTS, wild)).highDbm).toBe(40);
  });

  it('hold a difference that is off the strip at its edge', () => {
    expect(differenceToY(9)).toBe(STRIP.top);
    expect(differenceToY(-9)).toBe(STRIP.bottom);
    expect(differenceToY(0)).toBe(STRIP.middle);
  });

  // 0 dBm is 1 mW by definition; ten times the power for each 10 dB.
  it.each([
    [40, '10 W'],
    [30, '1 W'],
    [0, '1 mW'],
    [-20, '10 µW'],
    [-40, '100 nW'],
  ])('write %s dBm as %s', (dbm, power) => expect(powerLabel(dbm)).toBe(power));

  it('break a name on two lines', () => {
    expect([twoLines('Balanced modulator'), twoLines('Mixer'), twoLines('Pre-driver')]).toEqual([
      ['Balanced', 'modulator'],
      ['Mixer'],
      ['Pre-', 'driver'],
    ]);
  });
});

describe('the level diagram', () => {
  it('has its table for a screen reader while the drawing is shown, with the drawing’s own figures', () => {
    const { container } = render(<LevelDiagram points={POINTS} entered={ENTERED} currentId="pre" />);
    const drawn = [...container.querySelectorAll('svg text')].map((text) => text.textContent);
    const rows = within(screen.getByRole('table')).getAllByRole('row').slice(1);
    expect(rows.map((row) => within(row).getByRole('rowheader').textContent)).toEqual(
      POINTS.map(({ name }) => name),
    );
    levelRows(POINTS, ENTERED).forEach((row, index) => {
      const cells = within(rows[index])
        .getAllByRole('cell')
        .map((cell) => cell.textContent);
      expect(cells[0]).toContain(signed(row.point.planDbm));
      for (const value of [row.offPlanDb, row.gainMeasuredDb]) {
        if (value === undefined) continue;
        expect(drawn).toContain(signed(value));
        expect(cells.slice(2, 4)).toContain(signed(value));
      }
    });
  });

  it('is one tab stop: arrows step, each stage is read, Enter opens it', () => {
    const onOpen = vi.fn();
    render(<LevelDiagram points={POINTS} currentId="mixer" onOpen={onOpen} />);
    const diagram = screen.getByRole('group', { name: /Left and Right/ });
    fireEvent.keyDown(diagram, { key: 'ArrowRight' });
    expect(screen.getByText(/^Band-pass filter\. Planned/)).toBeInTheDocument();
    fireEvent.keyDown(diagram, { key: 'End' });
    expect(screen.getByText(/^Pre-driver\. .*Not measured/)).toBeInTheDocument();
    fireEvent.keyDown(diagram, { key: 'Enter' });
    expect(onOpen).toHaveBeenCalledWith('pre');
  });

  it('switches to the table with T or its switch, and the device remembers', async () => {
    const user = userEvent.setup();
    const first = render(<LevelDiagram points={POINTS} />);
    fireEvent.keyDown(screen.getByRole('group', { name: /Left and Right/ }), { key: 't' });
    expect(screen.queryByRole('img')).not.toBeInTheDocument();
    first.unmount();
    render(<LevelDiagram points={POINTS} />);
    expect(screen.getByRole('button', { name: 'Table' })).toHaveAttribute('aria-pressed', 'true');
    await user.click(screen.getByRole('button', { name: 'Diagram' }));
    expect(screen.getByRole('img')).toHaveAccessibleName(
      /from −16.5 dBm at Mixer to \+1.5 dBm at Pre-driver, 2 of 3/,
    );
  });
});
