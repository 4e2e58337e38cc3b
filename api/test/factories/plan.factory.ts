import { randomUUID } from 'node:crypto';
import type { Actor } from '../../src/common/actor';
import type { PlanDescription } from '../../src/plans/plan-description';
import { PlansService } from '../../src/plans/plans.service';
import type { TestApp } from '../app';
import { person } from './person.factory';

const SCOPE = { probeRatio: 10, loadOhms: 50, readToDivisions: 0.1 };

/**
 * Three stages with checks of all five kinds: a source, an amplifier fed by it, and the air. Every call a new one.
 *
 * @param scopeKind - name of the kind of instrument its levels are read on, when there is one.
 */
export function smallPlan(overrides: Partial<PlanDescription> = {}, scopeKind?: string): PlanDescription {
  const scope = scopeKind === undefined ? {} : { instrumentKind: scopeKind };
  return {
    name: `Plan ${randomUUID().slice(0, 8)}`,
    summary: 'A source and an amplifier.',
    edition: 1,
    stages: [
      {
        name: 'Source',
        summary: '',
        levelPoints: [{ testPoint: 'TP1', name: 'Source', plannedDbm: -19, toleranceDb: 1.5 }],
        checks: [
          { key: 'clean', kind: 'tick', title: 'Board cleaned' },
          {
            key: 'source-output',
            kind: 'measure',
            title: 'Output level at TP1',
            measure: {
              ...{ method: 'oscilloscope', unit: 'dBm', levelPoint: 'TP1', defaults: SCOPE, ...scope },
              window: { low: -20.5, high: -17.5 },
            },
          },
          { key: 'photo', kind: 'photo', title: 'Photo of the board' },
          { key: 'eyes', kind: "mentor's eyes", title: 'Looked at the joints' },
        ],
      },
      {
        name: 'Amplifier',
        summary: '',
        cautions: ['load before power'],
        levelPoints: [
          { testPoint: 'TP2', name: 'Amplifier', plannedDbm: 1.5, toleranceDb: 1.5, limitDbm: 10 },
        ],
        checks: [
          {
            key: 'input',
            kind: 'measure',
            title: 'Input level at TP1',
            measure: {
              ...{ method: 'carried', unit: 'dBm', from: ['source-output'] },
              window: { low: -20.5, high: -17.5 },
            },
          },
          {
            key: 'output',
            kind: 'measure',
            title: 'Output level at TP2',
            measure: {
              ...{ method: 'oscilloscope', unit: 'dBm', levelPoint: 'TP2', defaults: SCOPE, ...scope },
              window: { low: 0, high: 3 },
            },
          },
          {
            key: 'gain',
            kind: 'measure',
            title: 'Gain',
            measure: {
              ...{ method: 'gain', unit: 'dB', from: ['output', 'input'], target: 20.5 },
              window: { low: 19, high: 22 },
            },
          },
          { key: 'load', kind: 'safety', title: 'The load was fitted', isRequired: false },
        ],
      },
      {
        name: 'On the air',
        summary: '',
        cautions: ['licence needed', 'rf exposure'],
        checks: [
          { key: 'licence', kind: 'safety', title: 'A licence is in force' },
          {
            key: 'return-loss',
            kind: 'measure',
            title: 'Return loss',
            measure: {
              ...{ method: 'meter', unit: 'dB', window: { low: 14 } },
              defaults: { accuracyRel: 0, accuracyFixed: 0.15 },
            },
          },
        ],
      },
    ],
    ...overrides,
  };
}

/** Somebody of the club as the services see them. */
export async function actorWith(test: TestApp, ...roles: Actor['roles'][number][]): Promise<Actor> {
  const made = await person(test, { roles: ['member', ...roles] });
  return { personId: made.id, name: made.name, roles: made.roles };
}

/** @returns id of the published edition. */
export async function published(test: TestApp, plan = smallPlan()): Promise<string> {
  return test.app.get(PlansService).publish(await actorWith(test, 'mentor'), plan);
}
