import type { Build, BuildCheck, BuildStage, Reading } from '../api/builds';

/** A measured level, nothing read yet, unless told. */
export const aCheck = (overrides: Partial<BuildCheck> = {}): BuildCheck => ({
  ...{ id: 'output', position: 1, kind: 'measure', title: 'Output level at TP9', instruction: '' },
  ...{ isRequired: true, method: 'oscilloscope', unit: 'dBm', windowLow: 0, windowHigh: 3, target: 1.5 },
  ...{ defaults: { probeRatio: 10, loadOhms: 50, readToDivisions: 0.1 }, fromCheckIds: [] },
  ...{ levelPointId: 'tp9', instrumentKindId: null, isSettled: false, readings: [], mark: null, photos: [] },
  ...overrides,
});

/** +0.37 ± 0.47 dBm: too close to call in a window from 0. */
export const aReading = (overrides: Partial<Reading> = {}): Reading => ({
  ...{ id: 'reading', checkId: 'output', method: 'oscilloscope', entry: {}, value: 0.37, unit: 'dBm' },
  ...{
    uncertaintyUnit: 'dB',
    expandedUncertainty: 0.47,
    components: [],
    voltsPeakToPeak: 0.66,
    watts: 0.00109,
  },
  ...{ verdict: 'too close to call', calculation: 'oscilloscope/1', instrumentId: null, instrumentTag: null },
  ...{
    calibrationDueOn: null,
    cautionAcknowledged: false,
    takenAt: '2026-10-15T18:46:00Z',
    isSuperseded: false,
  },
  ...overrides,
});

export const aStage = (overrides: Partial<BuildStage> = {}): BuildStage => ({
  ...{ id: 'stage-9', position: 9, name: 'Pre-driver', summary: '', cautions: [], state: 'on the bench' },
  ...{
    lockedBecause: null,
    missingToSend: 1,
    missingToSignOff: 1,
    settled: 0,
    checks: [aCheck()],
    events: [],
  },
  ...overrides,
});

/** Tamsin's build with this one stage. */
export const aBuild = (stage: BuildStage = aStage(), overrides: Partial<Build> = {}): Build => ({
  ...{ id: 'build', builder: { id: '6b1f0a52-7d2c-4c1e-9d0e-2f6a3f7b9c01', name: 'Tamsin Ardley' } },
  ...{ planId: 'plan', planName: 'Larkmoor Twenty', editionNumber: 1, serial: 7 },
  ...{ startedAt: '2026-09-01T18:00:00Z', endedAt: null, licenceSeenAt: null, currentStageId: stage.id },
  stages: [stage],
  levelPoints: [
    {
      ...{ id: 'tp9', stageId: stage.id, name: 'Pre-driver', testPoint: 'TP9' },
      ...{ plannedDbm: 1.5, toleranceDb: 1.5, limitDbm: 10 },
    },
  ],
  ...overrides,
});
