/** A decimal number as typed, split from what follows it. */
export interface TypedNumber {
  sign: '' | '-' | '±';
  /** Digits with a decimal point at most, no grouping. */
  digits: string;
  /** Power of ten typed as e3. */
  exponent: number;
  /** Unit text after the number. */
  rest: string;
  /** True when it was not written as plain digits with a point: worth repeating back. */
  isUnusual: boolean;
}

/** `1,500`: a decimal comma or a thousand. Holds both, as digits. */
export interface AmbiguousNumber {
  asDecimal: string;
  asThousands: string;
  sign: TypedNumber['sign'];
  rest: string;
}

const SIGNED = /^(?<sign>\+\/-|[-+±])?\s*(?<body>.*)$/s;
const NUMBER =
  /^(?<number>\d{1,3}(?: \d{3})+(?:[.,]\d+)?(?!\d)|\d+(?:[.,]\d+)*|[.,]\d+)(?:e(?<exponent>[-+]?\d{1,3})(?![\d.]))?(?<rest>.*)$/is;
const GROUPED = /^\d{1,3}(?:([.,])\d{3})(?:\1\d{3})*$/;

/** Every way the signs and letters are typed, brought to one. */
export function normalised(text: string): string {
  return text
    .replace(/[\u2212\u2013]/g, '-')
    .replace(/\u03bc/g, 'µ')
    .replace(/[\u03a9\u2126]/g, 'ohm')
    .replace(/\s/g, ' ')
    .trim();
}

/**
 * Reads the number at the start of a normalised text.
 *
 * @returns undefined when there is none.
 */
export function typedNumber(text: string): TypedNumber | AmbiguousNumber | undefined {
  const { sign = '', body = '' } = SIGNED.exec(text)?.groups ?? {};
  const { number, exponent, rest = '' } = NUMBER.exec(body)?.groups ?? {};
  if (number === undefined) return undefined;
  const read = { sign: signOf(sign), rest: rest.trim() };
  const digits = plainDigits(number);
  if (digits === undefined) return undefined;
  if (typeof digits !== 'string') return { ...read, ...digits };
  const isUnusual = digits !== number || exponent !== undefined || read.sign === '±';
  return { ...read, digits, exponent: Number(exponent ?? 0), isUnusual };
}

function signOf(sign: string): TypedNumber['sign'] {
  if (sign === '±' || sign === '+/-') return '±';
  return sign === '-' ? '-' : '';
}

/**
 * | typed | read as |
 * | --- | --- |
 * | `4 700`, `1,234,567`, `1.234.567` | thousands |
 * | `1,5`, `0,125`, `1,2345` | decimal comma |
 * | `1,234.5`, `1.234,5` | thousands, then the decimal mark that comes last |
 * | `4,700` | either: ask |
 * | `1,2,3`, `1.2.3` | not a number |
 */
function plainDigits(
  number: string,
): string | Pick<AmbiguousNumber, 'asDecimal' | 'asThousands'> | undefined {
  const compact = number.replace(/ /g, '');
  const marks = compact.replace(/\d/g, '');
  if (marks === '' || marks === '.') return compact;
  if (marks === ',') return compact === number ? decimalComma(compact) : compact.replace(',', '.');
  if (GROUPED.test(compact)) return compact.replace(/[.,]/g, '');
  const last = marks.slice(-1);
  const [whole = '', fraction = ''] = splitAtLast(compact, last);
  const isMixed = GROUPED.test(whole) && !whole.includes(last);
  return isMixed ? `${whole.replace(/[.,]/g, '')}.${fraction}` : undefined;
}

function decimalComma(number: string): string | Pick<AmbiguousNumber, 'asDecimal' | 'asThousands'> {
  const asDecimal = number.replace(',', '.');
  const couldBeThousands = GROUPED.test(number) && !number.startsWith('0');
  return couldBeThousands ? { asDecimal, asThousands: number.replace(',', '') } : asDecimal;
}

function splitAtLast(text: string, mark: string): [string, string] {
  const at = text.lastIndexOf(mark);
  return [text.slice(0, at), text.slice(at + 1)];
}
