import { z } from 'zod';

export const passwordLengthLeast = 15;
export const passwordLengthMost = 128;

/**
 * Long, much-used passwords that meet the length. Written from memory of what such lists hold; a password made of one short
 * piece repeated is caught by rule instead.
 */
const common = new Set([
  'passwordpassword', 'password12345678', 'password123456789', '123456789012345', '1234567890123456', '12345678901234567890',
  'qwertyuiopasdfgh', 'qwertyuiopasdfghjkl', 'qwertyuiopasdfghjklzxcvbnm', 'iloveyouiloveyou', 'abcdefghijklmnop',
  'abcdefghijklmnopqrstuvwxyz', 'letmeinletmeinletmein', 'correcthorsebatterystaple', 'correct horse battery staple',
  'administrator123', 'welcometotherealworld', 'thequickbrownfox', 'changemechangeme', 'passwordpassword1',
]);

function repeatsOnePiece(password: string): boolean {
  return (password + password).indexOf(password, 1) < password.length && password.length / ((password + password).indexOf(password, 1)) >= 3;
}

/** The rules for a new password: length as typed, not a common one; no rules about kinds of characters. */
export const newPasswordSchema = z
  .string()
  .refine((password) => [...password].length >= passwordLengthLeast, `Use at least ${passwordLengthLeast} characters; a short sentence is easy to remember.`)
  .refine((password) => [...password].length <= passwordLengthMost, `Use at most ${passwordLengthMost} characters.`)
  .refine((password) => !common.has(password.toLowerCase()) && !repeatsOnePiece(password), 'This password is too common. Choose another.');

export const emailSchema = z.string().trim().toLowerCase().max(254).pipe(z.email('Give an e-mail address such as ann@example.org.'));
