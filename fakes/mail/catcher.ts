import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import { LOOPBACK } from '../common/listen';
import type { Mailbox } from './mailbox';
import { messageFrom } from './message';
import type { Settings } from './settings';

/** Takes every mail from this machine, without sign-in or encryption, and delivers none. */
export function startCatcher(mailbox: Mailbox, { smtpPort, largestBytes }: Settings): Promise<SMTPServer> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    size: largestBytes,
    closeTimeout: 500,
    onData: (stream, session, done) => void take(mailbox, stream, session).then(() => done(), done),
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(smtpPort, LOOPBACK, () => {
      server.off('error', reject);
      // A sender that hangs up in the middle of a mail must not end the program.
      server.on('error', (error) => process.stderr.write(`smtp: ${error.message}\n`));
      resolve(server);
    });
  });
}

async function take(
  mailbox: Mailbox,
  stream: SMTPServerDataStream,
  session: SMTPServerSession,
): Promise<void> {
  // Read now: the server empties the envelope as soon as the mail is answered.
  const recipients = session.envelope.rcptTo.map(({ address }) => address);
  // Loaded with the first mail: the parser is half of what this program loads, and a start should be quick.
  const { simpleParser } = await import('mailparser');
  const parsed = await simpleParser(stream, { skipTextToHtml: true, skipImageLinks: true });
  if (stream.sizeExceeded) throw tooLarge();
  mailbox.add(messageFrom(parsed, recipients));
}

const tooLarge = () =>
  Object.assign(new Error('This mail is larger than the stand-in keeps'), { responseCode: 552 });
