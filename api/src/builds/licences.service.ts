import { Injectable } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { Build } from './build.entity';
import { buildProblems } from './builds.errors';
import { licenceDto, type LicenceDto } from './dto/licence.dto';

/** Whose licence was seen: what stands between a finished transmitter and the air. */
@Injectable()
export class LicencesService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /** Every build under way of those who are still in the club, by builder. */
  async list(actor: Actor): Promise<LicenceDto[]> {
    requireRole(actor, 'organiser');
    const builds = await this.dataSource.getRepository(Build).find({
      where: { endedAt: IsNull(), person: { leftAt: IsNull() } },
      relations: { person: true, edition: { plan: true }, licenceSeenBy: true },
      order: { person: { name: 'ASC' }, serial: 'ASC' },
    });
    return builds.map(licenceDto);
  }

  /** An organiser has seen the builder's licence, which opens the way on the air. */
  async see(actor: Actor, buildId: string): Promise<void> {
    requireRole(actor, 'organiser');
    const builds = this.dataSource.getRepository(Build);
    const seen = { licenceSeenAt: this.clock.now(), licenceSeenById: actor.personId };
    const { affected } = await builds.update({ id: buildId, licenceSeenAt: IsNull() }, seen);
    if (affected) return;
    if (await builds.existsBy({ id: buildId })) {
      throw buildProblems['licence-seen-already']('It was seen before.');
    }
    throw notFound('build');
  }
}
