import { Html, html, page } from '../common/html';
import { TEST_CARDS } from './cards';
import type { Session } from './shapes';
import type { Basket } from './store';

const NOTICE = html`<p class="notice">Stand-in card page. No money moves.</p>`;

export interface PayForm {
  session: Session;
  lines: Basket['lines'];
  typed?: string;
  error?: string;
}

export const payPage = ({ session, lines, typed, error }: PayForm): string =>
  page(
    'Pay by card (stand-in)',
    html`${NOTICE}
      <h1>Pay ${money(session.amount_total, session.currency)} by card</h1>
      ${basketTable(lines, session.currency)}
      <form method="post">
        <p>
          <label for="card">Card number</label>
          <input
            id="card"
            name="card"
            inputmode="numeric"
            autocomplete="off"
            maxlength="40"
            value="${typed ?? ''}"
            aria-describedby="card-error card-help"
            ${new Html(error ? 'aria-invalid="true" autofocus' : '')}
          />
        </p>
        <div id="card-error" role="alert">${error ? html`<p class="error">${error}</p>` : ''}</div>
        <p>
          <button name="choice" value="pay">Pay</button>
          <button name="choice" value="back">Go back</button>
        </p>
      </form>
      <section id="card-help">
        <p>Never type a real card number here. These test numbers work:</p>
        ${cardTable()}
      </section>`,
  );

/** For a session that can no longer be paid. */
export const closedPage = (words: string, link?: { url: string; label: string }): string =>
  page(
    'Card page (stand-in)',
    html`${NOTICE}
      <h1>${words}</h1>
      ${link ? html`<p><a href="${link.url}">${link.label}</a></p>` : ''}`,
  );

const basketTable = (lines: Basket['lines'], currency: string) =>
  html`<table>
    <tr>
      <th scope="col">For</th>
      <th scope="col">Number</th>
      <th scope="col">Each</th>
    </tr>
    ${lines.map(
      (line) =>
        html`<tr>
          <td>${line.name}</td>
          <td>${line.quantity}</td>
          <td>${money(line.unitMinor, currency)}</td>
        </tr>`,
    )}
  </table>`;

const cardTable = () =>
  html`<table>
    <tr>
      <th scope="col">Number</th>
      <th scope="col">What it does</th>
    </tr>
    ${TEST_CARDS.map(
      (card) =>
        html`<tr>
          <td><code>${card.number.replace(/(\d{4})(?=\d)/g, '$1 ')}</code></td>
          <td>${card.says}</td>
        </tr>`,
    )}
  </table>`;

/** The currency's own number of decimals (ISO 4217), as the runtime knows it. */
function money(amountMinor: number, currency: string): string {
  const format = new Intl.NumberFormat('en-GB', { style: 'currency', currency: currency.toUpperCase() });
  return format.format(amountMinor / 10 ** (format.resolvedOptions().maximumFractionDigits ?? 2));
}
