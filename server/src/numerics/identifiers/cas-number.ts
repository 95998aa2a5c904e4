const FORM = /^[1-9]\d{1,6}-\d{2}-\d$/;

/**
 * Is this a CAS Registry Number whose check digit agrees?
 *
 * The digits before the check digit, counted from the right and from 1, are multiplied by their position and added;
 * the sum modulo 10 is the check digit. Source: CAS, "Check Digit Verification of CAS Registry Numbers" (from memory).
 */
export function isCasNumber(text: string): boolean {
  if (!FORM.test(text)) return false;
  const digits = [...text.replaceAll('-', '')].map(Number);
  const check = digits.pop();
  const sum = digits.reverse().reduce((total, digit, i) => total + digit * (i + 1), 0);
  return sum % 10 === check;
}
