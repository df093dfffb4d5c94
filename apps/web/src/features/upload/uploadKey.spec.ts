import { z } from 'zod';
import { newUploadKey } from './uploadKey';

describe('the key of an upload', () => {
  it('is a UUID, new each time, with and without randomUUID', () => {
    const randomUuid = Object.getOwnPropertyDescriptor(crypto, 'randomUUID');
    const keys = [newUploadKey()];
    Object.defineProperty(crypto, 'randomUUID', { value: undefined, configurable: true });
    try {
      keys.push(newUploadKey(), newUploadKey());
    } finally {
      if (randomUuid) Object.defineProperty(crypto, 'randomUUID', randomUuid);
      else Reflect.deleteProperty(crypto, 'randomUUID');
    }
    expect(keys.map((key) => z.uuid().safeParse(key).success)).toEqual([true, true, true]);
    expect(new Set(keys).size).toBe(3);
  });
});
