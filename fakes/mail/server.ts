import { JsonFile } from '../common/json-file';
import { closeServer, listen, portOf } from '../common/listen';
import { mailApp } from './app';
import { startCatcher } from './catcher';
import { Mailbox } from './mailbox';
import type { Settings } from './settings';

export async function startMail(settings: Settings) {
  const mailbox = new Mailbox(
    settings.stateFile === undefined ? undefined : new JsonFile(settings.stateFile),
  );
  const smtp = await startCatcher(mailbox, settings);
  const http = await listen(mailApp(mailbox), settings.httpPort);
  const [httpPort, smtpPort] = [portOf(http), portOf(smtp.server)];
  return {
    httpPort,
    smtpPort,
    readyLine: `listening ${httpPort} smtp ${smtpPort}`,
    close: async () => {
      await Promise.all([closeServer(http), new Promise<void>((resolve) => smtp.close(() => resolve()))]);
    },
  };
}
