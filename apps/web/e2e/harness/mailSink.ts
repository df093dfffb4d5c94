import { expect } from '@playwright/test';
import { browserSettings } from './browserSettings';

export interface SunkMail {
  subject: string;
  text: string;
}

/** Waits until a mail to somebody is there whose text holds a link of this kind; gives back the newest such link. */
export async function linkFromMail(email: string, path: 'verify' | 'reset' | 'new-address'): Promise<string> {
  const { mailSinkUrl, publicUrl } = browserSettings();
  const link = new RegExp(`${publicUrl}/${path}/\\S+`);
  const newest = async () => {
    const answer = await fetch(`${mailSinkUrl}/messages?to=${encodeURIComponent(email)}`);
    const mails = (await answer.json()) as SunkMail[];
    return mails.map(({ text }) => link.exec(text)?.[0]).find((found) => found !== undefined);
  };
  await expect.poll(newest, `a mail to ${email} with a link to ${path}`).toBeDefined();
  return (await newest())!;
}

/** Waits for the newest mail to somebody with such a subject. */
export async function mailTo(email: string, subject: RegExp): Promise<SunkMail> {
  const { mailSinkUrl } = browserSettings();
  const newest = async () => {
    const answer = await fetch(`${mailSinkUrl}/messages?to=${encodeURIComponent(email)}`);
    const mails = (await answer.json()) as SunkMail[];
    return mails.find((mail) => subject.test(mail.subject));
  };
  await expect.poll(newest, `a mail to ${email} about ${subject}`).toBeDefined();
  return (await newest())!;
}
