import fc from 'fast-check';

/** Short texts of every kind of character that could reach an entry field, punctuation and other scripts included. */
export function anyText(maxLength = 14): fc.Arbitrary<string> {
  return fc.array(fc.oneof(fc.integer({ min: 0, max: 0x24ff }), fc.integer({ min: 0xd7f0, max: 0x1ffff })), { maxLength })
    .map((codes) => String.fromCodePoint(...codes));
}
