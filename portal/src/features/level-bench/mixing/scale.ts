/** Under this a product is off the scale, dBm. */
export const FLOOR_DBM = -120;

const SPAN_DB = 120;
const GRID_DB = 20;

export interface Room {
  width: number;
  isPhone: boolean;
}

export interface Scale {
  left: number;
  right: number;
  top: number;
  bottom: number;
  height: number;
  /** Level at the top, dBm: 0 unless something is stronger. The filter's 0 dB is there too. */
  topDbm: number;
  maxHertz: number;
  isPhone: boolean;
  x: (hertz: number) => number;
  /** Of a level, held to the plot. */
  y: (dbm: number) => number;
  /** Of the filter's gain. */
  yOfGain: (db: number) => number;
}

/** Where everything stands, in pixels. */
export function scaleOf({ width, isPhone }: Room, maxHertz: number, strongestDbm: number): Scale {
  const [left, right] = isPhone ? [60, width - 10] : [62, width - 40];
  const [top, bottom] = isPhone ? [24, 158] : [23, 256];
  const topDbm = Math.max(0, Math.ceil(strongestDbm / GRID_DB) * GRID_DB);
  const perDb = (bottom - top) / SPAN_DB;
  const held = (down: number) => top + Math.min(Math.max(down, 0), SPAN_DB) * perDb;
  return {
    left,
    right,
    top,
    bottom,
    height: bottom + 42,
    topDbm,
    maxHertz,
    isPhone,
    x: (hertz) => left + ((right - left) * hertz) / maxHertz,
    y: (dbm) => held(topDbm - dbm),
    yOfGain: (db) => held(-db),
  };
}

/** Foot of the plot, dBm. */
export const bottomOf = ({ topDbm }: Scale): number => topDbm - SPAN_DB;

/** Levels with a line of the grid, from the top. */
export const gridOf = ({ topDbm }: Scale): number[] =>
  Array.from({ length: SPAN_DB / GRID_DB + 1 }, (_one, index) => topDbm - index * GRID_DB);

const STEPS_MEGAHERTZ = [10, 20, 50, 100, 200, 500, 1000];
const LEAST_STEP = 34;

/** Frequencies with a figure, Hz: every 10 MHz where there is room for them. */
export function figuresOf({ left, right, maxHertz }: Scale): number[] {
  const room = (right - left) / LEAST_STEP;
  const megahertz = maxHertz / 1e6;
  const step = STEPS_MEGAHERTZ.find((one) => megahertz / one <= room) ?? megahertz;
  const count = Math.floor(megahertz / step + 1e-9);
  return Array.from({ length: count + 1 }, (_one, index) => index * step * 1e6);
}
