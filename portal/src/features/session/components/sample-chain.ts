import type { LevelPoint } from '../../../shared-ui/level-diagram/level-point';

const point = (
  stageNumber: number,
  name: string,
  planDbm: number,
  toleranceDb: number,
  limitDbm?: number,
): LevelPoint => ({ id: name, stageNumber, name, planDbm, toleranceDb, limitDbm });

/** The sample plan's level chain, a picture for people who are not signed in yet. */
export const SAMPLE_CHAIN: readonly LevelPoint[] = [
  point(4, 'Balanced modulator', -18, 2, -10),
  point(5, 'Crystal filter', -24, 2, -14),
  point(6, 'IF amplifier', -10, 1.5, 8),
  point(8, 'Mixer', -16.5, 2, -6),
  point(8, 'Band-pass filter', -19, 1.5),
  point(9, 'Pre-driver', 1.5, 1.5, 10),
  point(10, 'Driver', 20.5, 1.5, 25),
  point(11, 'Power amplifier', 37.5, 1, 39),
  point(11, 'Low-pass filter', 37, 1, 43),
];
