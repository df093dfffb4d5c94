import { AddressInfo } from 'node:net';
import { ParsedMail, simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { until } from './until';

export interface MailSink {
  url: string;
  /** The next mail to this address that was not given yet. */
  next(to: string): Promise<ParsedMail>;
  count(to: string): number;
  /** From now on this many mails are refused for a while, as a busy mail server does it. */
  refuse(count: number): void;
  refused(): number;
  close(): Promise<void>;
}

/** A mail server that keeps what it is given. */
export async function startMailSink(): Promise<MailSink> {
  const mails: ParsedMail[] = [];
  const given = new Set<ParsedMail>();
  let toRefuse = 0;
  let refused = 0;
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onMailFrom(_address, _session, callback) {
      if (toRefuse === 0) return callback();
      toRefuse -= 1;
      refused += 1;
      callback(new Error('Busy'));
    },
    onData(stream, _session, callback) {
      simpleParser(stream).then(
        (mail) => {
          mails.push(mail);
          callback();
        },
        (error: Error) => callback(error),
      );
    },
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const to = (address: string) =>
    mails.filter((mail) => [mail.to ?? []].flat().some((each) => each.text.includes(address)));
  return {
    url: `smtp://127.0.0.1:${(server.server.address() as AddressInfo).port}`,
    async next(address) {
      const mail = await until(() => Promise.resolve(to(address).find((each) => !given.has(each)) ?? null));
      given.add(mail);
      return mail;
    },
    count: (address) => to(address).length,
    refuse: (count) => (toRefuse = count),
    refused: () => refused,
    close: () => new Promise((resolve) => server.close(() => resolve())),
  };
}

/** The token of the one link in a mail, which leads to this page. */
export function tokenIn(mail: ParsedMail, page: 'verify' | 'reset' | 'new-address' | 's'): string {
  const [, token] =
    new RegExp(`^http://thudline\\.test/${page}/([\\w-]{43})$`, 'm').exec(mail.text ?? '') ?? [];
  if (!token) throw new Error(`There is no link to /${page} in this mail: ${mail.text}`);
  return token;
}
