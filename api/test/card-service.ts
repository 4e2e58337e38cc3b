import { spawn, type ChildProcess } from 'node:child_process';
import { existsSync } from 'node:fs';
import path from 'node:path';

const PROGRAM = path.join(__dirname, '../../fakes/dist/payments/main.js');

export interface CardServiceProcess {
  baseUrl: string;
  control: (path: string, body?: Record<string, string>) => Promise<unknown>;
  stop: () => Promise<void>;
}

/** The stand-in for the card service, as the program it is; built by `npm run build -w fakes`. */
export async function startCardService(keys: {
  secretKey: string;
  webhookSecret: string;
}): Promise<CardServiceProcess> {
  if (!existsSync(PROGRAM)) throw new Error('Run `npm run build -w fakes` first.');
  const program = spawn(process.execPath, [PROGRAM], {
    env: {
      ...process.env,
      PORT: '0',
      FAKE_SECRET_KEY: keys.secretKey,
      FAKE_WEBHOOK_SECRET: keys.webhookSecret,
      FAKE_LATE_MS: '300',
    },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  const baseUrl = `http://127.0.0.1:${await portOf(program)}`;
  return {
    baseUrl,
    control: async (what, body) => {
      const answer = await fetch(`${baseUrl}/control/${what}`, {
        method: 'POST',
        body: new URLSearchParams(body ?? {}),
      });
      if (!answer.ok) throw new Error(`${what}: ${answer.status} ${await answer.text()}`);
      return answer.json();
    },
    stop: () => stopped(program),
  };
}

function portOf(program: ChildProcess): Promise<number> {
  return new Promise((resolve, reject) => {
    program.once('exit', (code) => reject(new Error(`The stand-in ended with ${String(code)}.`)));
    program.stdout?.on('data', (data: Buffer) => {
      const port = /listening (\d+)/.exec(data.toString())?.[1];
      if (port) resolve(Number(port));
    });
  });
}

function stopped(program: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    program.once('exit', () => resolve());
    program.kill('SIGTERM');
  });
}
