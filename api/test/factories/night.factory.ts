import { randomUUID } from 'node:crypto';
import type supertest from 'supertest';
import { Resource } from '../../src/instruments/resource.entity';
import { Plan } from '../../src/plans/plan.entity';
import { PlanEdition } from '../../src/plans/plan-edition.entity';
import { Stage } from '../../src/plans/stage.entity';
import type { BuildNightDto } from '../../src/build-nights/dto/build-night.dto';
import type { PlanNightsDto } from '../../src/build-nights/dto/plan-nights.dto';
import type { TestApp } from '../app';

let position = 0;

/** A bench nobody else knows. */
export async function bench(test: TestApp, overrides: Partial<Resource> = {}): Promise<Resource> {
  position += 1;
  const tag = `Bench ${position}`;
  return test.dataSource
    .getRepository(Resource)
    .save({ kind: 'bench', tag, name: 'By the window', position, retiredAt: null, ...overrides });
}

/** A stage of a plan of its own. */
export async function stage(test: TestApp, name = 'Pre-driver'): Promise<Stage> {
  const { manager } = test.dataSource;
  const { id: planId } = await manager.save(Plan, { name: `Plan ${randomUUID()}`, summary: '' });
  const { id: editionId } = await manager.save(PlanEdition, { planId, number: 1, publishedAt: null });
  return manager.save(Stage, { editionId, position: 9, name, summary: '', cautions: [] });
}

/** A Tuesday evening in winter, with eight places. */
export function nightPlan(overrides: Partial<PlanNightsDto> = {}): PlanNightsDto {
  return {
    title: 'Winding evening',
    startsAt: '2026-01-20T19:30:00Z',
    endsAt: '2026-01-20T21:30:00Z',
    places: 8,
    ...overrides,
  };
}

/** A night that this mentor schedules. */
export async function night(
  mentor: supertest.Agent,
  overrides: Partial<PlanNightsDto> = {},
): Promise<BuildNightDto> {
  const response = await mentor.post('/api/build-nights').send(nightPlan(overrides)).expect(201);
  const { nights } = response.body as { nights: BuildNightDto[] };
  const [made] = nights;
  if (!made) throw new Error('no night was made');
  return made;
}
