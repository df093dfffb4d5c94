import { z } from 'zod';
import { readSignedToken, signedToken } from './signed-token';

const secret = 'a secret for tests only, 32 characters at least';
const schema = z.object({ email: z.string() });
const read = (token: string, purpose: 'invitation' | 'mail-choice' = 'invitation', by = secret) =>
  readSignedToken(token, { secret: by, purpose, schema });

describe('a token that says itself what it is about', () => {
  const token = signedToken(secret, 'invitation', { email: 'mika@example.org' });

  it('is read by whoever made it', () => {
    expect(read(token)).toEqual({ email: 'mika@example.org' });
    expect(token).toMatch(/^[\w-]+\.[\w-]+$/);
  });

  it('is none for another purpose, of another installation, changed or cut off', () => {
    expect(read(token, 'mail-choice')).toBeNull();
    expect(read(token, 'invitation', `${secret}!`)).toBeNull();
    const [body = '', mac = ''] = token.split('.');
    const other = Buffer.from(JSON.stringify({ email: 'oda@example.org' })).toString('base64url');
    for (const wrong of [`${other}.${mac}`, body, `${body}.`, token.slice(0, -1), '', 'nonsense.nonsense'])
      expect(read(wrong)).toBeNull();
  });

  it('is none where it doesn’t say what is expected', () => {
    expect(read(signedToken(secret, 'invitation', { name: 'Mika' }))).toBeNull();
  });
});
