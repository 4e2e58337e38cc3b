import { Injectable } from '@nestjs/common';
import { DataSource } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { skipOf } from '../common/paging.dto';
import type { Caution } from '../plans/stage.entity';
import { BuildStage } from './build-stage.entity';
import { BuildStageEvent } from './build-stage-event.entity';
import type { ListReviewsQueryDto, ReviewDto, ReviewsPageDto } from './dto/review.dto';

interface WaitingRow {
  build_id: string;
  stage_id: string;
  position: number;
  stage_name: string;
  cautions: Caution[];
  person_id: string;
  person_name: string;
  plan_name: string;
  serial: number;
  sent_at: Date;
  note: string;
  times_sent_back: number;
}

@Injectable()
export class ReviewsService {
  constructor(private readonly dataSource: DataSource) {}

  /** The stages that wait for a mentor, the longest waiting first. */
  async list(actor: Actor, query: ListReviewsQueryDto): Promise<ReviewsPageDto> {
    requireRole(actor, 'mentor');
    const { page, perPage } = query;
    const total = await this.dataSource.getRepository(BuildStage).countBy({ state: 'with mentor' });
    const rows = await this.dataSource.query<WaitingRow[]>(WAITING, [perPage, skipOf(query)]);
    const lastSignOff = await this.dataSource
      .getRepository(BuildStageEvent)
      .findOne({ where: { kind: 'signed off' }, order: { at: 'DESC' } });
    const items = rows.map((row) => reviewDto(row, actor));
    return { items, total, page, perPage, lastSignOffAt: lastSignOff?.at.toISOString() ?? null };
  }
}

const WAITING = `
  SELECT bs.build_id, bs.stage_id, s.position, s.name AS stage_name, s.cautions, b.person_id, p.name AS person_name,
         pl.name AS plan_name, b.serial, sent.at AS sent_at, sent.note,
         (SELECT count(*)::int FROM build_stage_event e
          WHERE e.build_id = bs.build_id AND e.stage_id = bs.stage_id AND e.kind = 'sent back') AS times_sent_back
  FROM build_stage bs
  JOIN build b ON b.id = bs.build_id
  JOIN person p ON p.id = b.person_id
  JOIN plan pl ON pl.id = b.plan_id
  JOIN stage s ON s.id = bs.stage_id
  JOIN LATERAL (SELECT at, note FROM build_stage_event e
                WHERE e.build_id = bs.build_id AND e.stage_id = bs.stage_id AND e.kind = 'sent'
                ORDER BY e.position DESC LIMIT 1) sent ON true
  WHERE bs.state = 'with mentor'
  ORDER BY sent.at, bs.build_id, bs.stage_id
  LIMIT $1 OFFSET $2`;

function reviewDto(row: WaitingRow, actor: Actor): ReviewDto {
  return {
    buildId: row.build_id,
    stageId: row.stage_id,
    stagePosition: row.position,
    stageName: row.stage_name,
    cautions: row.cautions,
    builder: { id: row.person_id, name: row.person_name },
    planName: row.plan_name,
    serial: row.serial,
    sentAt: row.sent_at.toISOString(),
    note: row.note,
    timesSentBack: row.times_sent_back,
    isOwn: row.person_id === actor.personId,
  };
}
