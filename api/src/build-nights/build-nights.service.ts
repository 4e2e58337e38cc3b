import { Injectable } from '@nestjs/common';
import { requireMember, type Actor } from '../common/actor';
import { fieldError, notFound } from '../common/common.errors';
import { BuildNightsRepository } from './build-nights.repository';
import type { BuildNightDetailDto, BuildNightsDto } from './dto/build-night.dto';
import type { ListNightsQueryDto } from './dto/list-nights.dto';
import { buildNightDetailDto, buildNightDto } from './night-view';
import { readInstant } from './plan.rules';

const LONGEST_LIST_MS = 100 * 24 * 3_600_000;

/** Reading: which nights there are, and who is coming. */
@Injectable()
export class BuildNightsService {
  constructor(private readonly nights: BuildNightsRepository) {}

  async list(actor: Actor, query: ListNightsQueryDto): Promise<BuildNightsDto> {
    requireMember(actor);
    const [from, to] = [readInstant('from', query.from), readInstant('to', query.to)];
    if (to <= from) throw fieldError('to', 'The end comes after the beginning.');
    if (to.getTime() - from.getTime() > LONGEST_LIST_MS)
      throw fieldError('to', 'At most 100 days at a time.');
    const records = await this.nights.between(from, to);
    return { items: records.map((record) => buildNightDto(record, actor.personId)) };
  }

  async show(actor: Actor, nightId: string): Promise<BuildNightDetailDto> {
    requireMember(actor);
    const record = await this.nights.byId(nightId);
    if (!record) throw notFound('build night');
    return buildNightDetailDto(record, actor.personId);
  }
}
