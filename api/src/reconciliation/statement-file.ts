import { commonProblems } from '../common/common.errors';
import { minorDigits } from '../common/minor-units';
import { reconciliationProblems } from './reconciliation.errors';
import { BadLine, readStatement, type StatementFile } from './statement-csv.rules';

export interface UploadedStatement {
  originalname: string;
  buffer: Buffer;
}

/**
 * What an uploaded file says.
 * @throws DomainError `statement-unreadable` (422, names the line), `wrong-kind-of-file` (415)
 */
export function readUploaded(
  { buffer }: UploadedStatement,
  fileName: string,
  currency: string,
  today: string,
): StatementFile {
  try {
    return readStatement(textOf(buffer), currency, minorDigits(currency), today);
  } catch (error) {
    if (!(error instanceof BadLine)) throw error;
    const detail = `${fileName}, line ${error.line}: ${error.reason} Nothing was kept.`;
    const errors = [{ pointer: '#/file', detail }];
    throw reconciliationProblems['statement-unreadable'](detail, {
      errors,
      extra: { line: error.line, fileName },
    });
  }
}

/** Browsers send the name as bytes that the parser reads as Latin-1. */
export function fileNameOf({ originalname }: UploadedStatement): string {
  const name = Buffer.from(originalname, 'latin1')
    .toString('utf8')
    .replaceAll(/[\u0000-\u001f/\\]/g, '');
  return name.slice(-120) || 'statement.csv';
}

/** @throws DomainError `wrong-kind-of-file` when the bytes are no text. */
function textOf(buffer: Buffer): string {
  try {
    const text = new TextDecoder('utf-8', { fatal: true }).decode(buffer);
    if (!text.includes('\u0000')) return text;
  } catch {
    // Not UTF-8: said below.
  }
  throw commonProblems['wrong-kind-of-file'](
    'The file is not text in UTF-8. Save the statement as CSV and choose that. Nothing was kept.',
  );
}
