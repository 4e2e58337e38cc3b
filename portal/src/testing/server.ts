import { setupServer } from 'msw/node';

/** Answers at the network's edge; each test adds what it needs with `server.use(...)`. */
export const server = setupServer();
