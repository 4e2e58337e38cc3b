import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { Interval } from '@nestjs/schedule';
import { InjectDataSource } from '@nestjs/typeorm';
import { createTransport, type Transporter } from 'nodemailer';
import { DataSource, IsNull, LessThanOrEqual, type EntityManager } from 'typeorm';
import { Clock } from '../common/clock';
import { Environment } from '../config/environment';
import { Mail } from './mail.entity';
import { isRefusedForGood, nextTry } from './mail.rules';

/** Sends what waits in the outbox. Every process runs it; a row locked by one is skipped by the others. */
@Injectable()
export class MailCarrier implements OnModuleDestroy {
  private readonly logger = new Logger(MailCarrier.name);
  private readonly transport: Transporter;
  private isBusy = false;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly environment: Environment,
    private readonly clock: Clock,
  ) {
    this.transport = createTransport({
      url: environment.SMTP_URL,
      connectionTimeout: 5000,
      socketTimeout: 10_000,
    });
  }

  onModuleDestroy(): void {
    this.transport.close();
  }

  @Interval(2000)
  async carryAll(): Promise<void> {
    if (this.isBusy) return;
    this.isBusy = true;
    try {
      while (await this.carryOne());
    } catch (error) {
      this.logger.error({ err: error }, 'The outbox cannot be read');
    } finally {
      this.isBusy = false;
    }
  }

  /** @returns whether there was a letter to carry. */
  async carryOne(): Promise<boolean> {
    return this.dataSource.transaction(async (manager) => {
      const mail = await manager.findOne(Mail, {
        where: { sentAt: IsNull(), givenUpAt: IsNull(), dueAt: LessThanOrEqual(this.clock.now()) },
        order: { dueAt: 'ASC', id: 'ASC' },
        lock: { mode: 'pessimistic_write', onLocked: 'skip_locked' },
      });
      if (!mail) return false;
      await this.send(manager, mail);
      return true;
    });
  }

  private async send(manager: EntityManager, { id, to, subject, text, tries }: Mail): Promise<void> {
    const now = this.clock.now();
    try {
      const messageId = `<${id}@ferrite-row>`;
      // Given as one address and not as text, so that a comma in it makes no second receiver.
      const receiver = { name: '', address: to };
      const from = this.environment.MAIL_FROM;
      await this.transport.sendMail({ from, to: receiver, subject, text, messageId });
      await manager.update(Mail, { id }, { sentAt: now, tries: tries + 1 });
    } catch (error) {
      const lastError = error instanceof Error ? error.message.slice(0, 500) : 'unknown';
      const dueAt = isRefusedForGood(error) ? undefined : nextTry(tries + 1, now);
      await manager.update(
        Mail,
        { id },
        { tries: tries + 1, lastError, ...(dueAt ? { dueAt } : { givenUpAt: now }) },
      );
      this.logger.warn({ mail: id, tries: tries + 1, lastError }, 'A letter could not be sent');
    }
  }
}
