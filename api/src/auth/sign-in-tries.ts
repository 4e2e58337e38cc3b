import { Injectable } from '@nestjs/common';
import { DataSource, MoreThan, type EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { commonProblems } from '../common/common.errors';
import { FAILURES_KEPT_MS, waitBeforeTry, type SignInTry } from './auth.rules';
import { SignInFailure } from './sign-in-failure.entity';

/**
 * Counts tries at signing in. Each is written down as a failure before the password is looked at, and taken back when it
 * was right: twenty sent in one moment are then counted as twenty, and no connection waits while a password is hashed.
 */
@Injectable()
export class SignInTries {
  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {}

  /**
   * @returns takes the try back: to be called when the password was right.
   * @throws DomainError `slow-down` (429) with `retryAfterSeconds`
   */
  async begin(attempt: SignInTry): Promise<() => Promise<void>> {
    const failures = this.dataSource.getRepository(SignInFailure);
    const id = await this.dataSource.transaction((manager) => this.note(manager, attempt));
    return async () => {
      await failures.delete({ id });
    };
  }

  /** Several may do it at once: each leaves alone what another is about to delete. */
  async forgetOldOnes(): Promise<void> {
    const before = new Date(this.clock.now().getTime() - FAILURES_KEPT_MS);
    await this.dataSource.query(
      `DELETE FROM sign_in_failure
       WHERE id IN (SELECT id FROM sign_in_failure WHERE failed_at < $1 FOR UPDATE SKIP LOCKED)`,
      [before],
    );
  }

  private async note(manager: EntityManager, attempt: SignInTry): Promise<string> {
    const { email, address } = attempt;
    // One after the other by email and by address; always in this order, so that nobody waits for each other.
    for (const what of [`sign-in email ${email}`, `sign-in address ${address}`])
      await manager.query('SELECT pg_advisory_xact_lock(hashtextextended($1, 0))', [what]);
    const failures = manager.getRepository(SignInFailure);
    const failedAt = this.clock.now();
    const since = MoreThan(new Date(failedAt.getTime() - FAILURES_KEPT_MS));
    const recent = await failures.findBy([
      { email, failedAt: since },
      { address, failedAt: since },
    ]);
    refuseHaste(waitBeforeTry(attempt, recent, failedAt));
    const { id } = await failures.save(failures.create({ email, address, failedAt }));
    return id;
  }
}

function refuseHaste(waitMs: number): void {
  if (waitMs === 0) return;
  const retryAfterSeconds = Math.ceil(waitMs / 1000);
  const detail = `Too many tries. The next one can be made in ${retryAfterSeconds} s. Your email is kept.`;
  throw commonProblems['slow-down'](detail, { extra: { retryAfterSeconds } });
}
