import { Column, Entity, PrimaryGeneratedColumn, Unique } from 'typeorm';

/** A kind of instrument: what a clearance is given for, and what a check of the plan asks for. */
@Entity()
@Unique('instrument_kind_name_once', ['name'])
export class InstrumentKind {
  @PrimaryGeneratedColumn('uuid')
  id: string;

  /** `Spectrum analyzer` */
  @Column('text')
  name: string;

  @Column('boolean')
  needsClearance: boolean;

  @Column('boolean')
  needsCalibration: boolean;
}
