import assert from 'node:assert/strict';
import path from 'node:path';
import { describe, it } from 'node:test';
import { root } from '../paths.mjs';
import { apiEnvironment, fakeAddresses } from './product.mjs';
import { readSettings, withoutOurs } from './settings.mjs';

const secrets = { databaseAdmin: 'a', database: 'b', signIn: 'c', cards: 'own key', cardEvents: 'e' };

/** @param {NodeJS.ProcessEnv} env @returns {import('./product.mjs').Place} */
const place = (env) => ({
  settings: readSettings(env),
  env,
  secrets,
  databaseUrl: 'postgres://own',
  folder: '/tmp',
  logs: '/tmp',
  ports: { cards: 1, mail: 2, smtp: 3 },
});

describe('settings', () => {
  it('listen on 127.0.0.1:4780 and keep data in the checkout unless told otherwise', () => {
    const { address, dataFolder } = readSettings({});
    assert.equal(address, 'http://127.0.0.1:4780');
    assert.equal(dataFolder, path.join(root, '.ferrite'));
  });

  for (const port of ['abc', '0', '70000', '80.5', '-1']) {
    it(`refuse PORT=${port}`, () => assert.throws(() => readSettings({ PORT: port }), /PORT has to be/));
  }

  it('show an address this machine can open when listening on all of its addresses', () => {
    assert.equal(readSettings({ HOST: '0.0.0.0', PORT: '8080' }).address, 'http://127.0.0.1:8080');
  });
});

describe('the stand-ins', () => {
  it('serve the API when no real service is named', () => {
    const env = apiEnvironment(place({}));
    assert.equal(env.STRIPE_API_BASE, 'http://127.0.0.1:1');
    assert.equal(env.SMTP_URL, 'smtp://127.0.0.1:3');
    assert.equal(env.FERRITE_DEMO, '1');
  });

  it('step aside for a real card service, whose key goes through untouched', () => {
    const real = place({ STRIPE_SECRET_KEY: 'real', STRIPE_WEBHOOK_SECRET: 'real too' });
    const env = apiEnvironment(real);
    assert.equal(env.STRIPE_SECRET_KEY, 'real');
    assert.equal(env.STRIPE_WEBHOOK_SECRET, 'real too');
    assert.equal(env.STRIPE_API_BASE, undefined);
    assert.deepEqual(fakeAddresses(real), { mail: 'http://127.0.0.1:2', cards: null });
  });

  it('step aside for a real mail server', () => {
    const real = place({ SMTP_URL: 'smtps://mail.example' });
    assert.equal(apiEnvironment(real).SMTP_URL, 'smtps://mail.example');
    assert.equal(fakeAddresses(real).mail, null);
  });

  it('show no demo accounts on a production start', () => {
    assert.equal(apiEnvironment(place({ NODE_ENV: 'production' })).FERRITE_DEMO, '0');
  });
});

describe('the environment of a test run', () => {
  it('holds nothing that leads to real data or real keys', () => {
    const names = ['DATABASE_URL', 'STRIPE_SECRET_KEY', 'SMTP_URL', 'PORT', 'FERRITE_DATA_DIR', 'NODE_ENV'];
    const env = Object.fromEntries(['PATH', ...names].map((name) => [name, 'x']));
    assert.deepEqual(withoutOurs(env), { PATH: 'x' });
  });
});
