import { Mailbox, type Message } from './mailbox';

const message = (id: string): Message => ({
  id,
  from: 'a@larkmoor.example',
  to: [],
  subject: id,
  text: '',
  html: null,
  receivedAt: '2027-01-01T00:00:00.000Z',
  attachments: [],
});

describe('the mailbox', () => {
  it('lets the oldest go beyond 1,000', () => {
    const mailbox = new Mailbox();
    for (let count = 1; count <= 1001; count += 1) mailbox.add(message(`m${count}`));
    expect(mailbox.all()).toHaveLength(1000);
    expect([mailbox.all()[0]?.id, mailbox.find('m2')?.id, mailbox.find('m1')]).toEqual([
      'm1001',
      'm2',
      undefined,
    ]);
  });
});
