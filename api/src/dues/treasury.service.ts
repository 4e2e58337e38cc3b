import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { Repository } from 'typeorm';
import { requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { sumMinor } from '../common/minor-units';
import { ClubService } from '../club/club.service';
import { ACCOUNTS } from '../ledger/account.entity';
import { LedgerService } from '../ledger/ledger.service';
import type { HoldingsDto, TreasurySummaryDto } from './dto/treasury.dto';
import { aged, daysLate, openOf } from './dues.rules';
import { InvoicesRepository } from './invoices.repository';
import { PaymentEvent } from './payment-event.entity';

@Injectable()
export class TreasuryService {
  constructor(
    @InjectRepository(PaymentEvent) private readonly events: Repository<PaymentEvent>,
    private readonly invoices: InvoicesRepository,
    private readonly ledger: LedgerService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /** Is the money in, where is it, and what is late. */
  async summary(actor: Actor): Promise<TreasurySummaryDto> {
    requireRole(actor, 'treasurer');
    const { timeZone, currency } = await this.club.settings();
    const now = this.clock.now();
    const today = clubDay(now, timeZone);
    const open = await this.invoices.find({ state: 'open' }, today);
    const late = open.filter((invoice) => daysLate(invoice, today) > 0);
    const balances = await this.ledger.balances();
    const balanceOf = (account: string): number =>
      balances.find(({ code }) => code === account)?.balanceMinor ?? 0;
    return {
      asOf: now.toISOString(),
      today,
      currency,
      dues: (await this.invoices.newestRun()) ?? null,
      holdings: await this.holdings(balanceOf, today),
      aged: aged(open, today),
      openCount: open.length,
      openMinor: sumMinor(open.map(openOf)),
      lateMinor: sumMinor(late.map(openOf)),
      latePeople: new Set(late.map(({ personId }) => personId)).size,
      creditMinor: -balanceOf(ACCOUNTS.membersInCredit),
      cardNotes: await this.cardNotes(),
    };
  }

  private async holdings(balanceOf: (account: string) => number, today: string): Promise<HoldingsDto> {
    const monthStart = `${today.slice(0, 7)}-01`;
    const month = await this.ledger.movement(ACCOUNTS.currentAccount, monthStart, today);
    return {
      currentAccountMinor: balanceOf(ACCOUNTS.currentAccount),
      inThisMonthMinor: month.inMinor,
      outThisMonthMinor: month.outMinor,
      cashBoxMinor: balanceOf(ACCOUNTS.cashBox),
      chequesInHandMinor: balanceOf(ACCOUNTS.chequesInHand),
      cardMoneyMinor: balanceOf(ACCOUNTS.cardMoney),
      transfersOnTheWayMinor: balanceOf(ACCOUNTS.transfersOnTheWay),
    };
  }

  private async cardNotes(): Promise<TreasurySummaryDto['cardNotes']> {
    const events = await this.events.find({
      where: { outcome: 'needs a look' },
      order: { receivedAt: 'DESC' },
      take: 20,
    });
    return events.map(({ id, receivedAt, note }) => ({ id, receivedAt: receivedAt.toISOString(), note }));
  }
}
