/**
 * Creditor references of ISO 11649: `RF`, two check digits, 1 to 21 letters or digits; check digits by ISO 7064
 * MOD 97-10 over the body followed by `RF` and the digits, with A = 10 … Z = 35.
 */
const LONGEST_BODY = 21;
const FORM = /^RF(\d{2})([A-Z0-9]{1,21})$/;

/** @throws RangeError when the body is empty, too long, or holds anything but letters and digits. */
export function creditorReference(body: string): string {
  const plain = body.toUpperCase();
  if (!/^[A-Z0-9]+$/.test(plain) || plain.length > LONGEST_BODY)
    throw new RangeError(`${body} cannot be the body of a creditor reference.`);
  return `RF${checkDigits(plain)}${plain}`;
}

/** Spaces of the printed form and small letters are let pass; nothing else is. */
export function isCreditorReference(text: string): boolean {
  return faultOf(text) === undefined;
}

/**
 * Why a text is no creditor reference; undefined when it is one.
 *
 * | text | answer |
 * |---|---|
 * | remainder is not 1 | wrong check digits |
 * | check digits 00, 01 or 99 | wrong check digits: the rule makes 02 to 98 only, though the remainder can be 1 |
 * | more than 25 characters | too long |
 */
export function faultOf(text: string): string | undefined {
  const plain = compact(text);
  if (!plain.startsWith('RF')) return 'it does not begin with RF';
  if (plain.length > LONGEST_BODY + 4) return 'it is longer than 25 characters';
  const [, digits, body] = FORM.exec(plain) ?? [];
  if (digits === undefined || body === undefined) return 'it is not RF, two digits, then letters and digits';
  // Comparing with the digits the body asks for also refuses 00, 01 and 99, which a bare remainder test lets through.
  return digits === checkDigits(body) ? undefined : 'its check digits are wrong';
}

/** In fours, as it is printed: `RF43 LRBD 0421`. */
export function printReference(reference: string): string {
  return compact(reference).replaceAll(/(.{4})(?=.)/g, '$1 ');
}

const compact = (text: string): string => text.replaceAll(' ', '').toUpperCase();

function checkDigits(body: string): string {
  return String(98 - remainderBy97(`${body}RF00`)).padStart(2, '0');
}

/** Digit by digit, because the number has up to 50 of them. */
function remainderBy97(text: string): number {
  let remainder = 0;
  for (const character of text) {
    const value = Number.parseInt(character, 36);
    remainder = (remainder * (value > 9 ? 100 : 10) + value) % 97;
  }
  return remainder;
}
