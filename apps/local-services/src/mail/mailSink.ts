import { serveOnLoopback, type RunningService } from '../runningService';
import { openMailbox } from './mailbox';
import { mailSite } from './mailSite';
import { startSmtpReceiver } from './smtpReceiver';

export interface MailSinkOptions {
  /** Folder that holds the mails; made when missing. */
  directory: string;
  /** Loopback ports; 0 takes a free one. */
  smtpPort: number;
  pagePort: number;
}

export interface MailSink extends RunningService {
  /** Where mail is sent to, such as `smtp://127.0.0.1:4704`; `url` is the page that shows it. */
  smtpUrl: string;
}

/**
 * Stands in for a mail service on this machine: takes every mail and shows it on a small page.
 *
 * @throws {Error} a port is taken, or the folder can't be written
 */
export async function startMailSink({ directory, smtpPort, pagePort }: MailSinkOptions): Promise<MailSink> {
  const mailbox = await openMailbox(directory);
  const site = await serveOnLoopback(mailSite(mailbox), pagePort);
  try {
    const receiver = await startSmtpReceiver(smtpPort, (message) => mailbox.add(message));
    const stop = async () => {
      await receiver.stop();
      await site.stop();
    };
    return { url: site.url, smtpUrl: receiver.url, stop };
  } catch (error) {
    await site.stop();
    throw error;
  }
}
