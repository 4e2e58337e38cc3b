import { creditorReference, faultOf, isCreditorReference, printReference } from './creditor-reference.rules';

/**
 * Source: ISO 11649 (form RF + 2 digits + up to 21 letters or digits), check digits by ISO 7064 MOD 97-10. The first
 * two are published examples of the standard's users; the others were worked out apart from this code.
 */
const SOUND: [body: string, reference: string, printed: string][] = [
  ['539007547034', 'RF18539007547034', 'RF18 5390 0754 7034'],
  ['5390075470Y', 'RF185390075470Y', 'RF18 5390 0754 70Y'],
  ['2348231', 'RF712348231', 'RF71 2348 231'],
  ['DUES2026000042', 'RF34DUES2026000042', 'RF34 DUES 2026 0000 42'],
  ['A1', 'RF90A1', 'RF90 A1'],
  ['123456789012345678901', 'RF40123456789012345678901', 'RF40 1234 5678 9012 3456 7890 1'],
  ['BENCH20261201X7', 'RF95BENCH20261201X7', 'RF95 BENC H202 6120 1X7'],
  ['000000000539007547034', 'RF18000000000539007547034', 'RF18 0000 0000 0539 0075 4703 4'],
];

describe('creditor references', () => {
  it.each(SOUND)('makes of %s the reference %s', (body, reference) => {
    expect(creditorReference(body)).toBe(reference);
    expect(isCreditorReference(reference)).toBe(true);
  });

  it.each(SOUND)('prints %s in fours and reads it back', (_body, reference, printed) => {
    expect(printReference(reference)).toBe(printed);
    expect(isCreditorReference(printed.toLowerCase())).toBe(true);
  });

  it.each([
    ['RF17539007547034', 'its check digits are wrong', 'a published counter-example'],
    ['RF18539007547043', 'its check digits are wrong', 'the last two figures changed places'],
    ['RF18539007547O34', 'its check digits are wrong', 'a letter O for a zero'],
    ['RF18', 'it is not RF, two digits, then letters and digits', 'no body'],
    ['RF191234567890123456789012', 'it is longer than 25 characters', 'too long, though the remainder is 1'],
    ['RF18-5390-0754-7034', 'it is not RF, two digits, then letters and digits', 'hyphens'],
    ['FR18539007547034', 'it does not begin with RF', 'another prefix'],
    ['RF00DUES0061', 'its check digits are wrong', '00 cannot be made, though the remainder is 1'],
    ['RF99DUES0025', 'its check digits are wrong', '99 cannot be made, though the remainder is 1'],
  ])('refuses %s: %s (%s)', (text, fault) => {
    expect(faultOf(text)).toBe(fault);
  });

  it('notices every figure taken for another figure, and every letter for another letter', () => {
    const sound = creditorReference('LRBD0421');
    for (const [at, character] of [...sound].entries())
      for (const other of /\d/.test(character) ? '0123456789' : 'ABCDEFGHIJKLMNOPQRSTUVWXYZ') {
        const changed = sound.slice(0, at) + other + sound.slice(at + 1);
        if (changed !== sound) expect([changed, isCreditorReference(changed)]).toEqual([changed, false]);
      }
  });

  it.each(['', '12-34', 'Ä1', 'A'.repeat(22)])('makes no reference of %j', (body) => {
    expect(() => creditorReference(body)).toThrow(RangeError);
  });
});
