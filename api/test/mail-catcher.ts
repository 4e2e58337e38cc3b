import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { createInterface } from 'node:readline';

const PROGRAM = path.join(__dirname, '../../fakes/dist/mail/main.js');

interface CaughtMail {
  from: string;
  to: string[];
  subject: string;
  text: string;
}

export interface MailCatcher {
  smtpUrl: string;
  /** What arrived for this address, the first first. */
  mailTo: (address: string) => Promise<CaughtMail[]>;
  all: () => Promise<CaughtMail[]>;
  stop: () => Promise<void>;
}

/** The mail stand-in as the product starts it: a program of its own that speaks SMTP. */
export async function startMailCatcher(): Promise<MailCatcher> {
  if (!existsSync(PROGRAM)) throw new Error('Build the stand-ins first: npm run build -w fakes');
  const child = spawn(process.execPath, [PROGRAM], {
    env: { ...process.env, SMTP_PORT: '0', HTTP_PORT: '0' },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const exited = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  const [, http, smtp] = await ports(child.stdout);
  const all = async (): Promise<CaughtMail[]> => {
    const answer = await fetch(`http://127.0.0.1:${http}/messages`);
    return ((await answer.json()) as CaughtMail[]).reverse();
  };
  return {
    smtpUrl: `smtp://127.0.0.1:${smtp}`,
    all,
    mailTo: async (address) => (await all()).filter(({ to }) => to.includes(address)),
    stop: async () => {
      child.kill('SIGTERM');
      await exited;
    },
  };
}

async function ports(output: NodeJS.ReadableStream): Promise<RegExpExecArray> {
  for await (const line of createInterface(output)) {
    const found = /^listening (\d+) smtp (\d+)/.exec(line);
    if (found) return found;
  }
  throw new Error('The mail catcher ended before it listened.');
}
