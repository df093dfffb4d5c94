import { mailSinkSettings, objectStoreSettings } from './settings';

const forObjects = {
  OBJECT_STORE_DIR: '/somewhere',
  S3_PORT: '4702',
  S3_BUCKET: 'thudline',
  S3_ACCESS_KEY: 'a',
  S3_SECRET_KEY: 'b',
};
const forMail = { MAIL_DIR: '/elsewhere', SMTP_PORT: '4704', MAIL_PAGE_PORT: '4705' };

test('reads where to keep objects and who may reach them', () => {
  expect(objectStoreSettings(forObjects)).toEqual({
    directory: '/somewhere',
    port: 4702,
    bucket: 'thudline',
    accessKey: 'a',
    secretKey: 'b',
  });
});

test('reads where mail arrives and where it is shown', () => {
  expect(mailSinkSettings(forMail)).toEqual({ directory: '/elsewhere', smtpPort: 4704, pagePort: 4705 });
});

test.each(Object.keys(forObjects))('names %s when it is missing', (name) => {
  expect(() => objectStoreSettings({ ...forObjects, [name]: '' })).toThrow(`${name} is not set.`);
});

test.each(Object.keys(forMail))('names %s when it is missing', (name) => {
  expect(() => mailSinkSettings({ ...forMail, [name]: '' })).toThrow(`${name} is not set.`);
});

test('refuses a port that is none', () => {
  expect(() => objectStoreSettings({ ...forObjects, S3_PORT: '70000' })).toThrow('S3_PORT is not a port.');
  expect(() => mailSinkSettings({ ...forMail, SMTP_PORT: 'x' })).toThrow('SMTP_PORT is not a port.');
});
