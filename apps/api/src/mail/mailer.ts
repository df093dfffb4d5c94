import { Inject, Injectable, Logger, OnApplicationShutdown } from '@nestjs/common';
import { createTransport, Transporter } from 'nodemailer';
import { Config } from '../config/config';
import { CONFIG } from '../config/config.module';
import { MailContent } from './templates/mail-content';

/** Hands mails to the mail server of SMTP_URL. */
@Injectable()
export class Mailer implements OnApplicationShutdown {
  private readonly logger = new Logger('Mail');
  private readonly transport: Transporter | null;
  private readonly from: string;

  constructor(@Inject(CONFIG) { mail }: Config) {
    this.from = mail.from;
    this.transport = mail.smtpUrl ? createTransport(mail.smtpUrl) : null;
  }

  /** @throws what the mail server refuses, or that it doesn't answer */
  async send(
    to: string,
    { subject, text, html }: MailContent,
    headers: Record<string, string> = {},
  ): Promise<void> {
    if (!this.transport) {
      this.logger.warn(`Not sent, because SMTP_URL is not set: ${subject}`);
      return;
    }
    await this.transport.sendMail({ from: this.from, to, subject, text, html, headers });
  }

  onApplicationShutdown(): void {
    this.transport?.close();
  }
}
