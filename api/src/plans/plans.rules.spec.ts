import { smallPlan } from '../../test/factories/plan.factory';
import type { CheckDescription, PlanDescription, StageDescription } from './plan-description';
import { disagreementsOf } from './plans.rules';

/** The small plan with one stage changed. */
function withStage(
  index: number,
  change: (stage: StageDescription) => Partial<StageDescription>,
): PlanDescription {
  const plan = smallPlan();
  const stages = plan.stages.map((stage, at) => (at === index ? { ...stage, ...change(stage) } : stage));
  return { ...plan, stages };
}

/** The small plan with the measure of one check changed. */
function withMeasure(
  key: string,
  change: Partial<NonNullable<CheckDescription['measure']>>,
): PlanDescription {
  const plan = smallPlan();
  const stages = plan.stages.map((stage) => ({
    ...stage,
    checks: stage.checks.map((check) =>
      check.key === key && check.measure ? { ...check, measure: { ...check.measure, ...change } } : check,
    ),
  }));
  return { ...plan, stages };
}

const details = (plan: PlanDescription): string[] => disagreementsOf(plan).map(({ detail }) => detail);

describe('a plan', () => {
  it('may be published when its levels, windows and limits meet', () => {
    expect(disagreementsOf(smallPlan())).toEqual([]);
  });

  it.each<[string, PlanDescription, string]>([
    [
      'feeds a stage with another window than the one before gives',
      withMeasure('input', { window: { low: -18, high: -15 } }),
      'Input level at TP1 takes -18 to -15, but Output level at TP1 gives -20.5 to -17.5 dBm.',
    ],
    [
      'judges a level by another window than it plans',
      withMeasure('output', { window: { low: 1, high: 4 } }),
      'Output level at TP2: TP2 is planned from 0 to 3 dBm.',
    ],
    [
      'plans a gain that its levels do not have',
      withMeasure('gain', { target: 18, window: { low: 16, high: 20 } }),
      'Gain aims at 18, the levels step by 20.5 dB.',
    ],
    [
      'aims outside its own window',
      withMeasure('gain', { window: { low: 21, high: 22 } }),
      'Gain aims at 20.5, outside its own window.',
    ],
    [
      'lets a level reach its limit',
      withStage(1, ({ levelPoints = [] }) => ({
        levelPoints: levelPoints.map((p) => ({ ...p, limitDbm: 2 })),
      })),
      'Amplifier may reach 3 dBm, over its limit 2.',
    ],
    [
      'asks a scope for a frequency',
      withMeasure('output', { unit: 'Hz' }),
      'Output level at TP2: the oscilloscope does not give Hz.',
    ],
    [
      'has a window without an end',
      withMeasure('return-loss', { window: {} }),
      'Return loss has no window, so no reading of it could pass.',
    ],
    [
      'has a reversed window',
      withMeasure('return-loss', { window: { low: 20, high: 14 } }),
      'The window of Return loss is reversed or empty.',
    ],
    [
      'makes a gain of one level',
      withMeasure('gain', { from: ['output'] }),
      'Gain is made of 2 measured checks.',
    ],
    [
      'makes a gain of a level further on',
      withMeasure('input', { from: ['output'] }),
      'Input level at TP1 is made of checks that come before it.',
    ],
    [
      'makes a gain of levels in the wrong order',
      withMeasure('gain', { from: ['input', 'output'] }),
      'Gain is the step between two level points that follow each other.',
    ],
    [
      'measures a point it does not have',
      withMeasure('output', { levelPoint: 'TP7' }),
      'Output level at TP2 measures TP7, which the plan does not have.',
    ],
  ])('is refused when it %s', (_what, plan, detail) => {
    expect(details(plan)).toContain(detail);
  });

  it('is refused when a stage of a watt or more does not warn of it', () => {
    const strong = { testPoint: 'TP2', name: 'Amplifier', plannedDbm: 37, toleranceDb: 1 };
    expect(details(withStage(1, () => ({ levelPoints: [strong] })))).toContain(
      'Amplifier drives a watt or more and has to warn of it.',
    );
  });

  it('is refused when its cautions have no safety check', () => {
    const plan = withStage(1, ({ checks }) => ({ checks: checks.filter(({ kind }) => kind !== 'safety') }));
    expect(details(plan)).toContain('Amplifier has cautions but no safety check to acknowledge them.');
  });

  it('is refused when a key stands in it twice, a point is not measured, a stage has no checks', () => {
    const twice = withStage(0, ({ checks }) => ({ checks: [...checks, ...checks.slice(0, 1)] }));
    expect(details(twice)).toContain('clean stands in the plan twice.');
    expect(details(withMeasure('source-output', { levelPoint: undefined }))).toContain(
      'TP1 needs one check of its own stage that measures it.',
    );
    expect(details(withStage(0, () => ({ checks: [], levelPoints: [] })))).toContain(
      'Source has no checks, so nothing could be signed off.',
    );
  });
});
