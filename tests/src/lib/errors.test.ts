// @vitest-environment node
import { describe, expect, it } from 'vitest';
import { ERROR_CODES } from '#shared/contracts/error-codes.ts';
import { signUpRequest } from '#shared/contracts/session.ts';
import { ApiError } from '../../../src/lib/api-error.ts';
import { checkForm } from '../../../src/lib/check-form.ts';
import { fieldMessages } from '../../../src/lib/field-messages.ts';
import { sayError } from '../../../src/lib/say-error.ts';

describe('sayError', () => {
  it.each(ERROR_CODES)('When the code is %s, then there is a sentence for it', (code) => {
    expect(sayError(new ApiError(400, code, 'what the server says.'))).toMatch(/^\S.*\.$/);
  });

  it('When the code tells only half, then the server speaks', () => {
    expect(sayError(new ApiError(413, 'too-large', 'got 3 MB, takes 2 MB'))).toBe('got 3 MB, takes 2 MB');
  });
});

describe('fieldMessages', () => {
  it('When fields are wrong, then each says what it got and takes', () => {
    expect(fieldMessages([{ path: 'dados.0.depth', message: '', got: '-1', takes: 'a length above 0' }])).toEqual({
      'dados.0.depth': 'Got -1; takes a length above 0.',
    });
  });

  it('When the field is a password, then what was typed is not shown', () => {
    const checked = checkForm(signUpRequest, {
      shopName: 'Tern',
      name: 'Ada',
      email: 'ada@example.com',
      password: 'otter',
      unit: 'in',
    });
    expect(checked).toEqual({ ok: false, fields: { password: 'Takes at least 10 characters.' } });
  });
});
