import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryGeneratedColumn,
  Unique,
  type Relation,
} from 'typeorm';
import { Plan } from './plan.entity';

/** One numbered edition of a plan. Once published, neither it nor anything in it changes (triggers see to that). */
@Entity()
@Unique('plan_edition_number_once', ['planId', 'number'])
@Unique('plan_edition_of_its_plan', ['id', 'planId'])
@Check('plan_edition_number_positive', `number > 0`)
export class PlanEdition {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  @Column('uuid')
  planId: string;

  @ManyToOne(() => Plan, { nullable: false })
  @JoinColumn({ name: 'plan_id', foreignKeyConstraintName: 'plan_edition_of_plan' })
  plan: Relation<Plan>;

  @Column('integer')
  number: number;

  @Column('timestamptz', { nullable: true })
  publishedAt: Date | null;
}
