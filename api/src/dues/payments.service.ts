import { Injectable } from '@nestjs/common';
import { DataSource, In, type FindOptionsWhere } from 'typeorm';
import { hasRole, requireMember, requireRole, type Actor } from '../common/actor';
import { Clock } from '../common/clock';
import { clubDay } from '../common/club-day';
import { fieldError, notFound } from '../common/common.errors';
import { constraintOf, translatingConstraints } from '../common/constraint';
import { skipOf } from '../common/paging.dto';
import { retryingOnce } from '../common/retrying';
import { ClubService } from '../club/club.service';
import { PeopleService } from '../people/people.service';
import type {
  ListPaymentsQueryDto,
  PaymentDto,
  PaymentsPageDto,
  ReceiptDto,
  TakePaymentDto,
} from './dto/payment.dto';
import { duesProblems } from './dues.errors';
import { Payment } from './payment.entity';
import { PaymentsRepository } from './payments.repository';
import { ReceiptMail } from './receipt-mail';
import { TillService } from './till.service';

const EARLIEST = '2000-01-01';

@Injectable()
export class PaymentsService {
  constructor(
    private readonly dataSource: DataSource,
    private readonly payments: PaymentsRepository,
    private readonly till: TillService,
    private readonly receipts: ReceiptMail,
    private readonly people: PeopleService,
    private readonly club: ClubService,
    private readonly clock: Clock,
  ) {}

  /**
   * Takes cash, a cheque or word of a transfer. The same `clientKey` again answers with the payment already taken.
   * @throws DomainError `payment-key-used` (409) when the key took a payment of another person or amount.
   */
  async take(actor: Actor, payment: TakePaymentDto): Promise<PaymentDto> {
    requireRole(actor, 'treasurer');
    await this.checkDay(payment.receivedOn);
    const before = await this.takenWith(payment);
    if (before) return before;
    try {
      return await this.takeOnce(actor, payment);
    } catch (error) {
      // Two presses at once: the later one finds the key taken by the earlier.
      const twin = constraintOf(error) === 'payment_client_key_once' && (await this.takenWith(payment));
      if (!twin) throw error;
      return twin;
    }
  }

  async list(actor: Actor, query: ListPaymentsQueryDto): Promise<PaymentsPageDto> {
    requireRole(actor, 'treasurer');
    const { page, perPage, personId, method } = query;
    const where: FindOptionsWhere<Payment> = { ...(personId && { personId }), ...(method && { method }) };
    const items = await this.payments.find(where, { skip: skipOf(query), take: perPage });
    return { items, total: await this.payments.count(where), page, perPage };
  }

  /** The receipt of a payment: the payer's own, and the treasurer's. */
  async receipt(actor: Actor, paymentId: string): Promise<ReceiptDto> {
    requireMember(actor);
    const payment = await this.payments.one({ id: paymentId });
    const isTheirs = payment?.personId === actor.personId || hasRole(actor, 'treasurer');
    if (!payment || !isTheirs || payment.isTakenBack) throw notFound('receipt');
    const { name, address, currency } = await this.club.settings();
    const treasurerName = await this.takenBy(paymentId);
    return { ...payment, clubName: name, clubAddress: address, currency, treasurerName };
  }

  /** Takes back a payment written down by mistake: its invoices are open again, the books hold both entries. */
  async takeBack(actor: Actor, paymentId: string): Promise<PaymentDto> {
    requireRole(actor, 'treasurer');
    const work = () =>
      this.dataSource.transaction(async (manager) => {
        const payment = await this.till.hold(manager, paymentId);
        if (payment.method === 'card' || payment.bankedOn !== null) throw notTakenBackHere(payment);
        await this.till.takeBack(manager, payment, actor.personId);
      });
    await retryingOnce(work);
    const payment = await this.payments.one({ id: paymentId });
    if (!payment) throw notFound('payment');
    return payment;
  }

  /** For other features: these payments with what they paid, by id. */
  async byIds(paymentIds: readonly string[]): Promise<Map<string, PaymentDto>> {
    if (paymentIds.length === 0) return new Map();
    const payments = await this.payments.find(
      { id: In([...paymentIds]) },
      { skip: 0, take: paymentIds.length },
    );
    return new Map(payments.map((payment) => [payment.id, payment]));
  }

  private async takeOnce(actor: Actor, payment: TakePaymentDto): Promise<PaymentDto> {
    const { note, ...rest } = payment;
    const work = () =>
      this.dataSource.transaction(async (manager) => {
        const id = await this.till.record(manager, {
          ...rest,
          note: note ?? '',
          takenById: actor.personId,
          cardSessionId: null,
        });
        const taken = await this.payments.one({ id }, manager);
        if (!taken) throw new Error(`The payment ${id} was taken and is not there.`);
        await this.receipts.queue(manager, taken);
        return taken;
      });
    return translatingConstraints(() => retryingOnce(work), {
      payment_from_person: () => fieldError('personId', 'There is no such person.'),
    });
  }

  private async takenWith({ clientKey, ...wanted }: TakePaymentDto): Promise<PaymentDto | undefined> {
    const before = await this.payments.one({ clientKey });
    if (!before) return undefined;
    const isSame =
      before.personId === wanted.personId &&
      before.amountMinor === wanted.amountMinor &&
      before.method === wanted.method;
    if (isSame) return before;
    throw duesProblems['payment-key-used'](
      `This form took ${before.receiptNumber} already. Open it again to take another payment.`,
    );
  }

  private async checkDay(receivedOn: string): Promise<void> {
    const { timeZone } = await this.club.settings();
    if (receivedOn > clubDay(this.clock.now(), timeZone))
      throw fieldError('receivedOn', 'That day has not come yet.');
    if (receivedOn < EARLIEST) throw fieldError('receivedOn', 'That is before the books begin.');
  }

  private async takenBy(paymentId: string): Promise<string> {
    const { takenById } = await this.dataSource.getRepository(Payment).findOneByOrFail({ id: paymentId });
    const taker = takenById && (await this.people.byIds([takenById])).get(takenById);
    if (taker) return taker.name;
    return (await this.people.holding('treasurer'))[0]?.name ?? '';
  }
}

function notTakenBackHere({ method, receiptNumber }: Payment): Error {
  const how =
    method === 'card'
      ? 'Card money goes back by a refund.'
      : 'The bank has it: take back its match on the statement first.';
  return duesProblems['payment-not-yours-to-take-back'](`${receiptNumber} cannot be taken back here. ${how}`);
}
