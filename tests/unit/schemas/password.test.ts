import { describe, expect, it } from 'vitest';
import { emailSchema, newPasswordSchema } from '@/lib/schemas/password';

const accepted = (password: string) => newPasswordSchema.safeParse(password).success;

describe('a new password', () => {
  it('has at least 15 characters, counted as typed', () => {
    expect(accepted('fourteen chars')).toBe(false);
    expect(accepted('fifteen chars ..')).toBe(true);
    // Fifteen signs of two units each are fifteen characters, not thirty.
    expect(accepted('🌽🚜🌱🌽🚜🌱🌽🚜🌱🌽🚜🌱🌽🚜')).toBe(false);
  });

  it('has at most 128 characters', () => {
    const sentence = 'the quick planter ran over the low ground at dawn '.repeat(3);
    expect(accepted(sentence.slice(0, 128))).toBe(true);
    expect(accepted(sentence.slice(0, 129))).toBe(false);
  });

  it.each(['passwordpassword', 'PasswordPassword', 'qwertyuiopasdfgh', 'abcabcabcabcabcabc', 'aaaaaaaaaaaaaaaaaa'])('is refused where it is common: %s', (password) => {
    expect(accepted(password)).toBe(false);
  });

  it('needs no kinds of characters', () => {
    expect(accepted('only small letters here')).toBe(true);
  });
});

describe('an e-mail address', () => {
  it('is trimmed and lower case, so that one person has one account', () => {
    expect(emailSchema.parse('  Ann@Example.ORG ')).toBe('ann@example.org');
  });
  it.each(['', 'ann', 'ann@', '@example.org', 'ann@example'])('is refused where it is none: "%s"', (email) => {
    expect(emailSchema.safeParse(email).success).toBe(false);
  });
});
