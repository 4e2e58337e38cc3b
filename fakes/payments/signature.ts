import { createHmac } from 'node:crypto';

/** Header value for one delivery: HMAC-SHA256 (RFC 2104, FIPS 180-4) of "time.payload", in hex. */
export function signatureHeader(payload: string, secret: string, seconds: number): string {
  const mac = createHmac('sha256', secret).update(`${seconds}.${payload}`, 'utf8').digest('hex');
  return `t=${seconds},v1=${mac}`;
}
