import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { JsonFile } from '../common/json-file';
import { duesCheckout, paidSession, startScene, submitCard } from '../testing/payments';
import { Store } from './store';

let folder: string;
let stateFile: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'payments-'));
  stateFile = join(folder, 'deeper', 'state.json');
});
afterEach(() => rmSync(folder, { recursive: true }));

describe('after a restart', () => {
  it('sessions are there and can be paid at the new address', async () => {
    const before = await startScene({ stateFile });
    const { id } = await before.stripe.checkout.sessions.create(duesCheckout());
    await before.close();
    const after = await startScene({ stateFile });
    const session = await after.stripe.checkout.sessions.retrieve(id);
    expect(session.url).toBe(`${after.base}/pay/${id}`);
    expect((await submitCard(String(session.url), '4242424242424242')).status).toBe(303);
    await after.close();
    expect(readdirSync(join(folder, 'deeper'))).toEqual(['state.json']);
  });

  it('events that were not delivered are delivered', async () => {
    const before = await startScene({ stateFile });
    await before.control('pause');
    await paidSession(before);
    await before.close();
    expect(before.receiver.received).toHaveLength(0);
    const after = await startScene({ stateFile });
    await after.receiver.waitFor(4);
    expect(after.types().at(-1)).toBe('checkout.session.completed');
    await after.close();
  });

  it('a slow payment is still confirmed, and keys are still known', async () => {
    const key = { idempotencyKey: 'kept' };
    const before = await startScene({ stateFile });
    const { id, url } = await before.stripe.checkout.sessions.create(duesCheckout(), key);
    await submitCard(String(url), '4000 0000 0000 1018');
    await before.close();
    const after = await startScene({ stateFile });
    expect(await after.control('confirm-late')).toEqual({ sessions: [id] });
    expect((await after.stripe.checkout.sessions.retrieve(id)).payment_status).toBe('paid');
    expect((await after.stripe.checkout.sessions.create(duesCheckout(), key)).id).toBe(id);
    await after.close();
  });

  it('a state file that is not one stops the start and is left alone', () => {
    const broken = join(folder, 'broken.json');
    writeFileSync(broken, '{"sess');
    expect(() => new Store(new JsonFile(broken))).toThrow('move it away');
    expect(readdirSync(folder)).toEqual(['broken.json']);
  });
});
