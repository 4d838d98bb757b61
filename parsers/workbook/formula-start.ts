/** A plain negative number, with or without separators; no spreadsheet program takes it for a formula. */
const NEGATIVE_NUMBER = /^-\d[\d.,]*$/;

/**
 * True where a spreadsheet program could take a text for a formula: it starts with = + - @, a tab or a
 * carriage return (OWASP ASVS 5, 1.2.10) and is not a plain negative number.
 */
export function startsLikeFormula(text: string): boolean {
  return /^[=+\-@\t\r]/.test(text) && !NEGATIVE_NUMBER.test(text);
}
