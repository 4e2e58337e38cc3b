import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager } from 'typeorm';
import { InstrumentKind } from './instrument-kind.entity';
import { Instrument } from './instrument.entity';
import { Resource } from './resource.entity';

export type NewKind = Omit<InstrumentKind, 'id'>;
export type NewBench = Pick<Resource, 'tag' | 'name'>;
export type NewInstrument = Pick<Resource, 'tag' | 'name'> &
  Pick<Instrument, 'kindId' | 'calibrationDueOn' | 'damageLevelDbm' | 'amplitudeAccuracyDb'> &
  Partial<Pick<Instrument, 'figures'>>;

/** For first set-up and seeds: writes down what stands in the room, in the order given. */
@Injectable()
export class InventoryService {
  constructor(private readonly dataSource: DataSource) {}

  async enrolKinds(kinds: readonly NewKind[]): Promise<InstrumentKind[]> {
    return this.dataSource.getRepository(InstrumentKind).save(kinds.map((kind) => ({ ...kind })));
  }

  async enrolBenches(benches: readonly NewBench[]): Promise<Resource[]> {
    return this.dataSource.transaction((manager) => this.enrol(manager, 'bench', benches));
  }

  async enrolInstruments(instruments: readonly NewInstrument[]): Promise<Resource[]> {
    return this.dataSource.transaction(async (manager) => {
      const resources = await this.enrol(manager, 'instrument', instruments);
      const rows = instruments.map(
        ({ kindId, calibrationDueOn, damageLevelDbm, amplitudeAccuracyDb, figures }, index) => ({
          resourceId: resources[index]?.id,
          ...{ kindId, calibrationDueOn, damageLevelDbm, amplitudeAccuracyDb, figures },
        }),
      );
      await manager.getRepository(Instrument).insert(rows);
      return resources;
    });
  }

  private async enrol(
    manager: EntityManager,
    kind: Resource['kind'],
    things: readonly NewBench[],
  ): Promise<Resource[]> {
    const taken = await manager.getRepository(Resource).countBy({ kind });
    return manager.getRepository(Resource).save(
      things.map(({ tag, name }, index) => ({
        kind,
        tag,
        name,
        position: taken + index + 1,
        retiredAt: null,
      })),
    );
  }
}
