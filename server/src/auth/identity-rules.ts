export const LONGEST_PERSON_NAME = 200;

/** Addresses are compared without regard to case and to the blanks around them. */
export function normalizeEmail(email: string): string {
  return email.normalize('NFC').trim().toLowerCase();
}
