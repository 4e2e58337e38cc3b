import { type Html, html, page } from '../common/html';
import type { Message } from './mailbox';

export const listPage = (messages: readonly Message[]): string =>
  page(
    `Caught mail (${messages.length})`,
    html`<h1>Caught mail</h1>
      <p>Mail sent on this machine stays here; none of it is delivered. Newest first.</p>
      ${messages.length === 0 ? html`<p>No mail yet.</p>` : listTable(messages)}`,
  );

const listTable = (messages: readonly Message[]): Html =>
  html`<table>
    <tr>
      <th scope="col">Received</th>
      <th scope="col">To</th>
      <th scope="col">Subject</th>
    </tr>
    ${messages.map(
      (message) =>
        html`<tr>
          <td>${message.receivedAt}</td>
          <td>${message.to.join(', ')}</td>
          <td><a href="/read/${message.id}">${message.subject || '(no subject)'}</a></td>
        </tr>`,
    )}
  </table>`;

/** An HTML body is shown as the text it was written in, never as a page. */
export const messagePage = (message: Message): string =>
  page(
    message.subject || '(no subject)',
    html`<p><a href="/">All mail</a></p>
      <h1>${message.subject || '(no subject)'}</h1>
      <p>From ${message.from}<br />To ${message.to.join(', ')}<br />Received ${message.receivedAt}</p>
      <pre>${message.text}</pre>
      ${
        message.html === null
          ? ''
          : html`<h2>HTML body, as written</h2>
              <pre>${message.html}</pre>`
      }
      ${attachmentList(message)}`,
  );

const attachmentList = ({ attachments }: Message): Html | '' =>
  attachments.length === 0
    ? ''
    : html`<h2>Attachments</h2>
        <ul>
          ${attachments.map(
            ({ filename, contentType, size }) => html`<li>${filename} (${contentType}, ${size} bytes)</li>`,
          )}
        </ul>`;

export const missingPage = (): string =>
  page(
    'No such mail',
    html`<h1>No such mail</h1>
      <p><a href="/">All mail</a></p>`,
  );
