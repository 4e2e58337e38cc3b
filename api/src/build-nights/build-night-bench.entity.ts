import { Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import { Resource } from '../instruments/resource.entity';
import { BuildNight } from './build-night.entity';

/** A bench the night has. Its booking in the bench book keeps everybody else off it. */
@Entity()
@Index('build_night_bench_resource', ['resourceId'])
export class BuildNightBench {
  @PrimaryColumn('uuid')
  nightId: string;

  @PrimaryColumn('uuid')
  resourceId: string;

  @ManyToOne(() => BuildNight, { nullable: false })
  @JoinColumn({ name: 'night_id', foreignKeyConstraintName: 'build_night_bench_of_night' })
  night: Relation<BuildNight>;

  @ManyToOne(() => Resource, { nullable: false })
  @JoinColumn({ name: 'resource_id', foreignKeyConstraintName: 'build_night_bench_is_resource' })
  resource: Relation<Resource>;
}
