import { type AddressInfo } from 'node:net';
import { simpleParser } from 'mailparser';
import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import { loopback, type RunningService } from '../runningService';
import { keptMessage, type KeptMessage } from './keptMessage';

/** More than any mail of an application; common practice, no source. */
const maxMailBytes = 10 * 1024 * 1024;
const closeWithinMs = 1_000;

/**
 * Takes every mail that is sent to it and passes it on; nothing leaves this machine. No TLS and no sign-in, because it
 * listens on loopback only.
 *
 * @throws {Error} the port is taken
 */
export async function startSmtpReceiver(
  port: number,
  receive: (message: KeptMessage) => Promise<void>,
): Promise<RunningService> {
  let received = 0;
  const server = new SMTPServer({
    // Said so that the library does not warn about its built-in certificate, which is never used.
    logger: false,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: maxMailBytes,
    closeTimeout: closeWithinMs,
    onData(stream, session, answer) {
      readMail(stream, session, received++)
        .then(receive)
        .then(
          () => answer(),
          (error: unknown) => answer(error instanceof Error ? error : new Error(String(error))),
        );
    },
  });
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, loopback, () => resolve());
  });
  server.on('error', (error: Error) => process.stderr.write(`mail: ${error.message}\n`));
  const { port: boundPort } = server.server.address() as AddressInfo;
  return {
    url: `smtp://${loopback}:${boundPort}`,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
}

async function readMail(
  stream: SMTPServerDataStream,
  session: SMTPServerSession,
  count: number,
): Promise<KeptMessage> {
  const receivedAt = new Date();
  const mail = await simpleParser(stream);
  if (stream.sizeExceeded) throw new Error(`A mail may have ${maxMailBytes} bytes here.`);
  // Sorts by arrival, also within one millisecond.
  const id = `${receivedAt.getTime()}-${String(count).padStart(6, '0')}`;
  const recipients = session.envelope.rcptTo.map(({ address }) => address);
  return keptMessage(mail, id, receivedAt, recipients);
}
