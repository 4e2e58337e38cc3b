import { randomBytes } from 'node:crypto';

export const newId = (prefix: string) => `${prefix}_${randomBytes(12).toString('hex')}`;

/** The protocol counts time in whole seconds. */
export const nowSeconds = () => Math.floor(Date.now() / 1000);
