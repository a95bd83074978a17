import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { signInSchema, signUpSchema } from './account-schema';
import { passwordProblem } from './password-rules';

const owner = { email: 'orrin.strom@example.test', name: 'Orrin Strom' };

describe('passwordProblem', () => {
  it.each([
    ['ninechars', 'at least 10'],
    ['x'.repeat(201), 'at most 200'],
    ['ORRIN.STROM@example.test', 'first thing'],
    ['Orrin.Strom', 'first thing'],
    ['orrin  strom', 'first thing'],
    ['aaaaaaaaaaaa', 'over and over'],
  ])('refuses %s', (password, why) => {
    expect(passwordProblem(password, owner)).toContain(why);
  });

  it('takes ten characters and two hundred, of any script', () => {
    expect(passwordProblem('ten chars!', owner)).toBeNull();
    expect(passwordProblem('abcde'.repeat(40), owner)).toBeNull();
    expect(passwordProblem('тихийлес🦌🌲', owner)).toBeNull();
  });
});

describe('signUpSchema', () => {
  it('trims, lowers the address and puts the password error beside its field', () => {
    const typed = { name: ' Orrin ', email: ' Orrin@Example.TEST ', password: 'ten chars!' };
    expect(signUpSchema.parse(typed)).toEqual({ name: 'Orrin', email: 'orrin@example.test', password: 'ten chars!' });
    const bad = signUpSchema.safeParse({ ...typed, password: 'short' });
    expect(bad.error?.issues.map((issue) => issue.path)).toEqual([['password']]);
  });

  it('refuses a name with line breaks, turned text or signs of markup', () => {
    for (const name of ['a\nb', 'a\u202eb', '<b>', '   ']) {
      expect(signUpSchema.safeParse({ name, email: 'a@example.test', password: 'ten chars!' }).success).toBe(false);
    }
  });

  it('answers anything at all without throwing', () => {
    fc.assert(
      fc.property(fc.anything(), (value) => {
        expect(typeof signUpSchema.safeParse(value).success).toBe('boolean');
        expect(typeof signInSchema.safeParse(value).success).toBe('boolean');
      }),
    );
  });
});
