import type { EntityManager } from 'typeorm';
import type { InvoiceKind } from './invoice.entity';

/** Sequences of the database: two at once never get the same number, and a number given up is not used again. */
const SERIES = {
  dues: { letter: 'D', sequence: 'invoice_number_dues' },
  'course fee': { letter: 'C', sequence: 'invoice_number_course_fee' },
  kit: { letter: 'K', sequence: 'invoice_number_kit' },
  receipt: { letter: 'R', sequence: 'receipt_number' },
} as const;

export async function nextNumber(manager: EntityManager, series: InvoiceKind | 'receipt'): Promise<string> {
  const { letter, sequence } = SERIES[series];
  const [row] = await manager.query<{ next: string }[]>('SELECT nextval($1::regclass)::text AS next', [
    sequence,
  ]);
  return `${letter}-${(row?.next ?? '').padStart(4, '0')}`;
}
