import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Bookkeeper } from './bookkeeper';
import { Matcher } from './matcher';
import { candidatesIn, findByReference, type Finding } from './reconciliation.rules';
import type { StatementLine } from './statement-line.entity';

/** Matches what carries an exact reference and the exact amount; everything else is left to a person. */
@Injectable()
export class SelfMatching {
  constructor(
    private readonly books: Bookkeeper,
    private readonly matcher: Matcher,
  ) {}

  /** The books are read once for all lines, and anew only for a line whose invoice an earlier one has touched. */
  async match(
    manager: EntityManager,
    lines: readonly StatementLine[],
    matchedById: string,
    currency: string,
  ): Promise<void> {
    const named = lines.filter(({ description }) => candidatesIn(description).length > 0);
    const books = await this.books.holdFor(manager, named);
    const touched = new Set<string>();
    for (const line of named) {
      const references = new Set(candidatesIn(line.description).flat());
      const isTouched = books.invoices.some(
        ({ id, reference }) => touched.has(id) && references.has(reference),
      );
      const current = isTouched ? await this.books.booksFor(manager, [line]) : books;
      const finding = findByReference(line, current, currency);
      for (const id of await this.write(manager, line, finding, matchedById)) touched.add(id);
    }
  }

  /** @returns the invoices whose standing is another one now. */
  private async write(
    manager: EntityManager,
    line: StatementLine,
    finding: Finding,
    matchedById: string,
  ): Promise<readonly string[]> {
    const because = { how: 'by itself' as const, reasons: finding.reasons, matchedById };
    if (finding.kind === 'transfer') {
      const { id, invoiceIds } = finding.transfer;
      await this.matcher.toPayment(manager, line, { id, method: 'transfer', madePayment: false }, because);
      return invoiceIds;
    }
    if (finding.kind === 'none') return [];
    const [{ personId } = { personId: '' }] = finding.invoices;
    const invoiceIds = finding.invoices.map(({ id }) => id);
    await this.matcher.toInvoices(manager, line, { personId, invoiceIds }, because);
    return invoiceIds;
  }
}
