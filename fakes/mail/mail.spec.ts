import { createTransport, type SendMailOptions } from 'nodemailer';
import { mkdtempSync, rmSync } from 'node:fs';
import { connect } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { LOOPBACK } from '../common/listen';
import { startMail } from './server';

const SETTINGS = { smtpPort: 0, httpPort: 0, largestBytes: 20_000 };

type Catcher = Awaited<ReturnType<typeof startMail>>;
let catcher: Catcher;
beforeEach(async () => {
  catcher = await startMail(SETTINGS);
});
afterEach(() => catcher.close());

const base = () => `http://${LOOPBACK}:${catcher.httpPort}`;
const messages = async () =>
  (await (await fetch(`${base()}/messages`)).json()) as { id: string; subject: string }[];

async function send(mail: SendMailOptions): Promise<void> {
  const transport = createTransport({
    host: LOOPBACK,
    port: catcher.smtpPort,
    secure: false,
    ignoreTLS: true,
  });
  await transport.sendMail({
    from: 'Larkmoor <post@larkmoor.example>',
    to: 'lena@larkmoor.example',
    ...mail,
  });
  transport.close();
}

describe('mail sent here', () => {
  it('is kept with its text, its umlauts and its attachments, and newest comes first', async () => {
    await send({ subject: 'First', text: 'one' });
    const attachments = [{ filename: 'night.ics', contentType: 'text/calendar', content: 'BEGIN:VCALENDAR' }];
    await send({ subject: 'Bauabend – Größe 1 Ω', text: 'Grüße\nfrom the bench', attachments });
    const [newest, oldest] = await messages();
    expect(newest).toMatchObject({
      from: 'post@larkmoor.example',
      to: ['lena@larkmoor.example'],
      subject: 'Bauabend – Größe 1 Ω',
      text: expect.stringContaining('Grüße\nfrom the bench') as string,
      attachments: [{ filename: 'night.ics', contentType: 'text/calendar', size: 15 }],
    });
    expect(oldest).toMatchObject({ subject: 'First', attachments: [] });
  });

  it('can be read whole by its id, with the content of attachments', async () => {
    await send({ subject: 'Invitation', attachments: [{ filename: 'a.txt', content: 'solder' }] });
    const [{ id } = { id: '' }] = await messages();
    const message: unknown = await (await fetch(`${base()}/messages/${id}`)).json();
    const contentBase64 = Buffer.from('solder').toString('base64');
    expect(message).toMatchObject({ id, attachments: [{ contentBase64 }] });
    expect((await fetch(`${base()}/messages/none`)).status).toBe(404);
  });

  it('lists every receiver of the envelope, blind copies too', async () => {
    await send({
      subject: 'x',
      to: 'a@larkmoor.example',
      cc: 'b@larkmoor.example',
      bcc: 'c@larkmoor.example',
    });
    const to = ['a@larkmoor.example', 'b@larkmoor.example', 'c@larkmoor.example'];
    expect(await messages()).toMatchObject([{ to }]);
  });

  it('is shown as text, whatever markup it carries', async () => {
    const script = '<script>alert(1)</script>';
    await send({ subject: script, text: script, html: `<b>${script}</b>` });
    const [{ id } = { id: '' }] = await messages();
    const [list, one] = await Promise.all([fetch(base()), fetch(`${base()}/read/${id}`)]);
    const shown = `${await list.text()}${await one.text()}`;
    expect(shown).not.toMatch(/<script|<b>/);
    expect(shown.split('&lt;script&gt;alert(1)&lt;/script&gt;').length).toBeGreaterThan(4);
    expect(one.headers.get('content-security-policy')).toContain("default-src 'none'");
  });

  it('can be thrown away', async () => {
    await send({ subject: 'x' });
    expect((await fetch(`${base()}/messages`, { method: 'DELETE' })).status).toBe(204);
    expect(await messages()).toEqual([]);
  });

  it('over the size kept is refused, and the next mail is taken', async () => {
    await expect(send({ subject: 'big', text: 'x'.repeat(20_001) })).rejects.toThrow(/552|larger|exceeds/);
    await send({ subject: 'small' });
    expect(await messages()).toMatchObject([{ subject: 'small' }]);
  });

  it('broken off half way is not kept and stops nothing', async () => {
    const socket = connect(catcher.smtpPort, LOOPBACK);
    socket.end(
      'EHLO x\r\nMAIL FROM:<a@larkmoor.example>\r\nRCPT TO:<b@larkmoor.example>\r\nDATA\r\nSubject: ha',
    );
    await new Promise((resolve) => socket.resume().once('close', resolve));
    await send({ subject: 'whole' });
    expect(await messages()).toMatchObject([{ subject: 'whole' }]);
  });
});

describe('mail with a state file', () => {
  it('is there after a restart', async () => {
    const folder = mkdtempSync(join(tmpdir(), 'mail-'));
    const settings = { ...SETTINGS, stateFile: join(folder, 'mail.json') };
    await catcher.close();
    catcher = await startMail(settings);
    await send({ subject: 'kept' });
    await catcher.close();
    catcher = await startMail(settings);
    expect(await messages()).toMatchObject([{ subject: 'kept' }]);
    rmSync(folder, { recursive: true });
  });
});
