import { signatureHeader } from './signature';

describe('the webhook signature', () => {
  it('is the HMAC that OpenSSL computes', () => {
    // printf '1700000000.{"id":"evt_1"}' | openssl dgst -sha256 -hmac whsec_check   (OpenSSL 3.0.19)
    expect(signatureHeader('{"id":"evt_1"}', 'whsec_check', 1_700_000_000)).toBe(
      't=1700000000,v1=8b28097d34df00636a171a16ab83a80d3a155fdecec583a46528988e8a0b32ab',
    );
  });
});
