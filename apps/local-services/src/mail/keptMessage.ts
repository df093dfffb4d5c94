import { type AddressObject, type ParsedMail } from 'mailparser';

/** A mail as it is kept and as `/messages` gives it out. */
export interface KeptMessage {
  /** Sorts by time of arrival. */
  id: string;
  /** ISO 8601. */
  receivedAt: string;
  from: string;
  /** Who the envelope names: bare addresses in lower case, hidden copies too. */
  to: string[];
  subject: string;
  text: string;
  /** Null where the mail has no HTML part. */
  html: string | null;
  /** Header names in lower case; the last one counts where a name comes twice. */
  headers: Record<string, string>;
}

const addressText = (address: AddressObject | undefined): string => address?.text ?? '';

/** What is worth keeping of a parsed mail. */
export function keptMessage(
  mail: ParsedMail,
  id: string,
  receivedAt: Date,
  recipients: string[],
): KeptMessage {
  return {
    id,
    receivedAt: receivedAt.toISOString(),
    from: addressText(mail.from),
    to: recipients.map((address) => address.toLowerCase()),
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || null,
    headers: Object.fromEntries(mail.headerLines.map(({ key, line }) => [key, valueOf(line)])),
  };
}

/** Folded lines joined, the name taken off. */
const valueOf = (line: string): string =>
  line
    .slice(line.indexOf(':') + 1)
    .replace(/\s+/g, ' ')
    .trim();
