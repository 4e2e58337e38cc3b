import { once } from 'node:events';
import { closeServer, listen, LOOPBACK, portOf } from '../common/listen';

interface Received {
  body: string;
  signature: string;
}

/** A webhook endpoint that answers as told and remembers what it was sent. */
export async function startReceiver() {
  const received: Received[] = [];
  const answers: number[] = [];
  const server = await listen((request, response) => {
    const chunks: Buffer[] = [];
    request.on('data', (chunk: Buffer) => chunks.push(chunk));
    request.on('end', () => {
      received.push({
        body: Buffer.concat(chunks).toString('utf8'),
        signature: String(request.headers['stripe-signature']),
      });
      response.writeHead(answers.shift() ?? 200).end();
      server.emit('received');
    });
  }, 0);
  return {
    url: `http://${LOOPBACK}:${portOf(server)}/hook`,
    received,
    answerNextWith: (...statuses: number[]) => void answers.push(...statuses),
    async waitFor(count: number): Promise<void> {
      while (received.length < count) await once(server, 'received', { signal: AbortSignal.timeout(4000) });
    },
    close: () => closeServer(server),
  };
}
