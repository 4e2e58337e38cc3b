import express, { type Express, type Response } from 'express';
import { PAGE_HEADERS } from '../common/html';
import type { Mailbox } from './mailbox';
import { summaryOf } from './message';
import { listPage, messagePage, missingPage } from './pages';

export function mailApp(mailbox: Mailbox): Express {
  const app = express();
  app.disable('x-powered-by');
  app.get('/health', (_request, response) => void response.json({ status: 'ok' }));
  addMessages(app, mailbox);
  app.get('/', (_request, response) => sendPage(response, listPage(mailbox.all())));
  app.get('/read/:id', (request, response) => {
    const message = mailbox.find(request.params.id);
    if (!message) response.status(404);
    sendPage(response, message ? messagePage(message) : missingPage());
  });
  return app;
}

function addMessages(app: Express, mailbox: Mailbox): void {
  app.get('/messages', (_request, response) => void response.json(mailbox.all().map(summaryOf)));
  app.get('/messages/:id', (request, response) => {
    const message = mailbox.find(request.params.id);
    response.status(message ? 200 : 404).json(message ?? { error: 'no such message' });
  });
  app.delete('/messages', (_request, response) => {
    mailbox.clear();
    response.status(204).end();
  });
}

function sendPage(response: Response, body: string): void {
  response.set(PAGE_HEADERS).type('html').send(body);
}
