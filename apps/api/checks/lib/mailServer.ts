import { SMTPServer } from 'smtp-server';

export interface MailServer {
  /** Addresses of the mails that arrived, in their order. */
  arrived: string[];
  open(): Promise<void>;
  /** From now on every connection is refused. */
  close(): Promise<void>;
}

export function createMailServer(port: number): MailServer {
  const arrived: string[] = [];
  let server: SMTPServer | undefined;
  return {
    arrived,
    async open() {
      const opened = new SMTPServer({
        authOptional: true,
        disabledCommands: ['STARTTLS'],
        onData: (stream, session, done) => {
          stream.resume();
          stream.on('end', () => {
            arrived.push(...session.envelope.rcptTo.map(({ address }) => address));
            done();
          });
        },
      });
      opened.on('error', () => undefined);
      await new Promise<void>((resolve) => opened.listen(port, '127.0.0.1', resolve));
      server = opened;
    },
    close: () => new Promise((resolve) => (server ? server.close(() => resolve()) : resolve())),
  };
}
