import { Injectable } from '@nestjs/common';
import { InjectRepository } from '@nestjs/typeorm';
import { In, IsNull, Repository, type EntityManager, type FindOptionsWhere } from 'typeorm';
import { sumMinor } from '../common/minor-units';
import { PeopleService } from '../people/people.service';
import type { PaymentDto } from './dto/payment.dto';
import { PaymentAllocation } from './payment-allocation.entity';
import { Payment } from './payment.entity';

/** Payments with what they paid and who made them. */
@Injectable()
export class PaymentsRepository {
  constructor(
    @InjectRepository(Payment) private readonly payments: Repository<Payment>,
    private readonly people: PeopleService,
  ) {}

  /** Latest first. */
  async find(
    where: FindOptionsWhere<Payment>,
    page: { skip: number; take: number },
    manager?: EntityManager,
  ): Promise<PaymentDto[]> {
    const payments = await this.in(manager).find({
      where,
      order: { receivedOn: 'DESC', receiptNumber: 'DESC' },
      ...page,
    });
    return this.described(payments, manager);
  }

  async count(where: FindOptionsWhere<Payment>): Promise<number> {
    return this.payments.count({ where });
  }

  async one(where: FindOptionsWhere<Payment>, manager?: EntityManager): Promise<PaymentDto | undefined> {
    return (await this.find(where, { skip: 0, take: 1 }, manager))[0];
  }

  private async described(payments: Payment[], manager?: EntityManager): Promise<PaymentDto[]> {
    if (payments.length === 0) return [];
    const allocations = await (manager ?? this.payments.manager).getRepository(PaymentAllocation).find({
      where: { paymentId: In(payments.map(({ id }) => id)), releasedAt: IsNull() },
      relations: { invoice: true },
      order: { allocatedAt: 'ASC', id: 'ASC' },
    });
    const people = await this.people.byIds(
      payments.map(({ personId }) => personId),
      manager,
    );
    return payments.map((payment) =>
      paymentDto(
        payment,
        people.get(payment.personId)?.name ?? '',
        allocations.filter(({ paymentId }) => paymentId === payment.id),
      ),
    );
  }

  private in(manager?: EntityManager): Repository<Payment> {
    return manager?.getRepository(Payment) ?? this.payments;
  }
}

function paymentDto(payment: Payment, personName: string, allocations: PaymentAllocation[]): PaymentDto {
  const { id, receiptNumber, personId, method, amountMinor, receivedOn, note, bankedOn, takenBackAt } =
    payment;
  const isTakenBack = takenBackAt !== null;
  const paidMinor = sumMinor(allocations.map((allocation) => allocation.amountMinor));
  return {
    id,
    receiptNumber,
    personId,
    personName,
    method,
    amountMinor,
    receivedOn,
    note,
    isBeingMatched: !isTakenBack && bankedOn === null && (method === 'transfer' || method === 'cheque'),
    isTakenBack,
    paid: allocations.map(({ invoiceId, invoice, amountMinor: share }) => ({
      invoiceId,
      invoiceNumber: invoice.number,
      description: invoice.description,
      amountMinor: share,
    })),
    creditMinor: isTakenBack ? 0 : amountMinor - paidMinor,
  };
}
