import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { IsNull, Repository } from 'typeorm';
import { ClubService } from '../club/club.service';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { notFound } from '../common/common.errors';
import { skipOf, type PageQueryDto } from '../common/paging.dto';
import { clubDay } from '../common/club-day';
import { ClearancesService } from './clearances.service';
import { benchDto, type BenchPageDto } from './dto/bench.dto';
import { instrumentChangeDto, type InstrumentHistoryDto } from './dto/instrument-change.dto';
import {
  instrumentDto,
  type InstrumentDetailDto,
  type InstrumentDto,
  type InstrumentPageDto,
} from './dto/instrument.dto';
import type { ListInstrumentsQueryDto, UseDayQueryDto } from './dto/list-instruments.dto';
import { InstrumentChange } from './instrument-change.entity';
import { factsOf } from './instrument-use.service';
import { Instrument } from './instrument.entity';
import { reasonsAgainst } from './instruments.rules';
import { Resource } from './resource.entity';

const WHOLE = { resource: true, kind: true } as const;

@Injectable()
export class InstrumentsService {
  constructor(
    @InjectRepository(Resource) private readonly resources: Repository<Resource>,
    @InjectRepository(Instrument) private readonly instruments: Repository<Instrument>,
    @InjectRepository(InstrumentChange) private readonly changes: Repository<InstrumentChange>,
    private readonly clearances: ClearancesService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  async benches(actor: Actor, query: PageQueryDto): Promise<BenchPageDto> {
    requireMember(actor);
    const { page, perPage } = query;
    const [found, total] = await this.resources.findAndCount({
      where: { kind: 'bench', retiredAt: IsNull() },
      order: { position: 'ASC', tag: 'ASC' },
      skip: skipOf(query),
      take: perPage,
    });
    return { items: found.map(benchDto), total, page, perPage };
  }

  async list(actor: Actor, query: ListInstrumentsQueryDto): Promise<InstrumentPageDto> {
    requireMember(actor);
    const { page, perPage, kindId, on } = query;
    const [found, total] = await this.instruments.findAndCount({
      where: { resource: { retiredAt: IsNull() }, ...(kindId && { kindId }) },
      relations: WHOLE,
      order: { resource: { position: 'ASC', tag: 'ASC' } },
      skip: skipOf(query),
      take: perPage,
    });
    return { items: await this.describe(actor, found, on), total, page, perPage };
  }

  async show(actor: Actor, instrumentId: string, { on }: UseDayQueryDto): Promise<InstrumentDetailDto> {
    requireMember(actor);
    const found = await this.instruments.findOne({
      where: { resourceId: instrumentId, resource: { retiredAt: IsNull() } },
      relations: WHOLE,
    });
    if (!found) throw notFound('instrument');
    const [shown] = await this.describe(actor, [found], on);
    if (!shown) throw notFound('instrument');
    return { ...shown, clearedPeople: await this.clearances.countHolders(found.kindId) };
  }

  async history(actor: Actor, instrumentId: string, query: PageQueryDto): Promise<InstrumentHistoryDto> {
    requireMember(actor);
    if (!(await this.instruments.existsBy({ resourceId: instrumentId }))) throw notFound('instrument');
    const { page, perPage } = query;
    const [found, total] = await this.changes.findAndCount({
      where: { instrumentId },
      relations: { changedBy: true },
      order: { changedAt: 'DESC', id: 'ASC' },
      skip: skipOf(query),
      take: perPage,
    });
    return { items: found.map(instrumentChangeDto), total, page, perPage };
  }

  private async describe(
    actor: Actor,
    found: Instrument[],
    on: string | undefined,
  ): Promise<InstrumentDto[]> {
    const { timeZone } = await this.club.settings();
    const today = clubDay(this.clock.now(), timeZone);
    const kindIds = [...new Set(found.map(({ kindId }) => kindId))];
    const held = await this.clearances.heldBy(actor.personId, kindIds);
    return found.map((instrument) => {
      const clearance = held.get(instrument.kindId);
      const reasons = reasonsAgainst(factsOf(instrument, clearance), { today, lastDay: on ?? today });
      return instrumentDto(instrument, clearance, reasons);
    });
  }
}
