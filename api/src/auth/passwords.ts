import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';

/**
 * argon2id (the package's default variant) at 19 MiB, two passes, one lane: the lower of the settings RFC 9106 and the usual guidance for web
 * servers allow, about 10 ms here. Raise them and old hashes go on working, since each names its own.
 */
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

@Injectable()
export class Passwords {
  /** Verified against when there is no such person, so that both answers take the same time. */
  private readonly nobodysHash = hash('nobody has this password', COST);

  hash(password: string): Promise<string> {
    return hash(password, COST);
  }

  async matches(passwordHash: string | null | undefined, password: string): Promise<boolean> {
    const isRight = await verify(passwordHash ?? (await this.nobodysHash), password);
    return isRight && Boolean(passwordHash);
  }
}
