import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { requireMember, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { commonProblems, fieldError, notFound } from '../common/common.errors';
import { PlansService } from '../plans/plans.service';
import { requireBuilder, requireSight } from './build-access';
import { BuildRecordsService } from './build-records.service';
import { buildProblems } from './builds.errors';
import { photoDto, type AddPhotoDto, type PhotoDto } from './dto/evidence.dto';
import { heldCheck, putOnTheBench, requireOpen } from './open-stage';
import { Photo } from './photo.entity';
import { MOST_PHOTOS, photoTypeOf } from './photos.rules';

@Injectable()
export class PhotosService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly plans: PlansService,
    private readonly records: BuildRecordsService,
    private readonly clock: Clock,
  ) {}

  /**
   * Keeps a picture. What it is, its first bytes say; the same picture sent twice is kept once.
   *
   * @throws DomainError `wrong-kind-of-file` (415), `photos-enough`, `stage-locked` or `stage-out-of-hand` (409)
   */
  async add(
    actor: Actor,
    buildId: string,
    checkId: string,
    bytes: Buffer | undefined,
    { caption = '' }: AddPhotoDto,
  ): Promise<PhotoDto> {
    requireMember(actor);
    if (!bytes || bytes.length === 0) throw fieldError('photo', 'Choose a picture.');
    return this.dataSource.transaction(async (manager) => {
      const build = requireBuilder(actor, await this.records.hold(manager, buildId));
      const edition = await this.plans.content(build.editionId, manager);
      const held = await heldCheck(manager, build, edition, checkId);
      if (held.check.kind !== 'photo') throw fieldError('checkId', 'This check does not ask for a photo.');
      requireOpen(build, edition, held);
      const contentType = photoTypeOf(bytes);
      if (!contentType)
        throw commonProblems['wrong-kind-of-file'](
          'A photo is a JPEG, PNG or WebP picture. Nothing was kept.',
        );
      const sha256 = createHash('sha256').update(bytes).digest('hex');
      const standing = { buildId, checkId, sha256, takenBackAt: IsNull() };
      const known = await manager.findOneBy(Photo, standing);
      if (known) return photoDto(known);
      if ((await manager.countBy(Photo, { buildId, checkId, takenBackAt: IsNull() })) >= MOST_PHOTOS)
        throw buildProblems['photos-enough'](
          `${held.check.title} has ${MOST_PHOTOS} photos, which is as many as it takes. Take one of them back first. Nothing was kept.`,
        );
      const photo = manager.create(Photo, {
        ...{ buildId, checkId, stageId: held.stage.id, byPersonId: actor.personId },
        ...{ bytes, contentType, sha256, caption, at: this.clock.now(), takenBackAt: null },
      });
      await manager.insert(Photo, photo);
      await putOnTheBench(manager, build, held.stage);
      return photoDto(photo);
    });
  }

  /** The picture itself, for those who may see the build. */
  async bytes(
    actor: Actor,
    buildId: string,
    photoId: string,
  ): Promise<Pick<Photo, 'bytes' | 'contentType' | 'sha256'>> {
    requireMember(actor);
    requireSight(actor, await this.records.find(buildId));
    const photo = await this.dataSource.getRepository(Photo).findOne({
      where: { id: photoId, buildId, takenBackAt: IsNull() },
      select: { id: true, bytes: true, contentType: true, sha256: true },
    });
    if (!photo) throw notFound('photo');
    return photo;
  }

  async takeBack(actor: Actor, buildId: string, photoId: string): Promise<void> {
    requireMember(actor);
    await this.dataSource.transaction(async (manager) => {
      const build = requireBuilder(actor, await this.records.hold(manager, buildId));
      const standing = { id: photoId, buildId, takenBackAt: IsNull() };
      const photo = await manager.findOneBy(Photo, standing);
      if (!photo) throw notFound('photo');
      const edition = await this.plans.content(build.editionId, manager);
      requireOpen(build, edition, await heldCheck(manager, build, edition, photo.checkId));
      await manager.update(Photo, standing, { takenBackAt: this.clock.now() });
    });
  }
}
