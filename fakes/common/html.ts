const ENTITIES: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

/** Markup that is already safe to send; only `html` makes it. */
export class Html {
  constructor(readonly markup: string) {}
}

const escapeHtml = (text: string) => text.replace(/[&<>"']/g, (sign) => ENTITIES[sign] ?? sign);

/** Builds markup; every value that is not itself `Html` is escaped, so forgetting to escape is not possible. */
export function html(parts: TemplateStringsArray, ...values: (string | number | Html | Html[])[]): Html {
  const pieces = parts.map((part, index) => part + (index < values.length ? render(values[index]) : ''));
  return new Html(pieces.join(''));
}

function render(value: string | number | Html | Html[] | undefined): string {
  if (value === undefined) return '';
  if (Array.isArray(value)) return value.map(render).join('');
  return value instanceof Html ? value.markup : escapeHtml(String(value));
}

const STYLE = new Html(`<style>
  :root { color-scheme: light dark; font: 16px/1.5 system-ui, sans-serif; }
  body { max-width: 46rem; margin: 2rem auto; padding: 0 1rem; }
  h1 { font-size: 1.4rem; } table { width: 100%; border-collapse: collapse; }
  td, th { text-align: left; padding: .35rem .5rem; border-bottom: 1px solid #8886; vertical-align: top; }
  input, button { font: inherit; padding: .5rem .75rem; } input { width: 100%; box-sizing: border-box; }
  pre { white-space: pre-wrap; overflow-wrap: anywhere; border: 1px solid #8886; padding: .75rem; }
  .notice { border: 2px dashed; padding: .5rem .75rem; font-weight: 600; }
  .error { border-left: 4px solid #c33; padding-left: .75rem; }
</style>`);

/** A whole page. It runs no script and loads nothing. */
export const page = (title: string, body: Html): string =>
  html`<!doctype html>
    <html lang="en-GB">
      <head>
        <meta charset="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <title>${title}</title>
        ${STYLE}
      </head>
      <body>
        <main>${body}</main>
      </body>
    </html> `.markup;

/** Sent with every page: nothing but its own style sheet may run or load, whatever slips into the markup. */
export const PAGE_HEADERS = {
  'content-security-policy':
    "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'; base-uri 'none'",
  'x-content-type-options': 'nosniff',
  'cache-control': 'no-store',
};
