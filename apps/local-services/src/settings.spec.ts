import { objectStoreSettings } from './settings';

const whole = {
  OBJECT_STORE_DIR: '/somewhere',
  S3_PORT: '4702',
  S3_BUCKET: 'thudline',
  S3_ACCESS_KEY: 'a',
  S3_SECRET_KEY: 'b',
};

test('reads where to keep objects and who may reach them', () => {
  expect(objectStoreSettings(whole)).toEqual({
    directory: '/somewhere',
    port: 4702,
    bucket: 'thudline',
    accessKey: 'a',
    secretKey: 'b',
  });
});

test.each(Object.keys(whole))('names %s when it is missing', (name) => {
  expect(() => objectStoreSettings({ ...whole, [name]: '' })).toThrow(`${name} is not set.`);
});

test('refuses a port that is none', () => {
  expect(() => objectStoreSettings({ ...whole, S3_PORT: '70000' })).toThrow('S3_PORT is not a port.');
});
