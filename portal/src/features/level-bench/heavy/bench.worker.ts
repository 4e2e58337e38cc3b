import type { Order } from './ask';
import { perform } from './tasks';

addEventListener('message', ({ data }: MessageEvent<Order>) => {
  postMessage({ id: data.id, outcome: perform(data.task, data.input) });
});
