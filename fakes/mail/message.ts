import type { ParsedMail } from 'mailparser';
import { randomUUID } from 'node:crypto';
import type { Attachment, Message } from './mailbox';

/** `recipients` are those of the envelope: it also has the blind copies, which the header must not show. */
export const messageFrom = (parsed: ParsedMail, recipients: string[]): Message => ({
  id: randomUUID(),
  from: parsed.from?.value[0]?.address ?? '',
  to: recipients,
  subject: parsed.subject ?? '',
  text: parsed.text ?? '',
  html: parsed.html || null,
  receivedAt: new Date().toISOString(),
  attachments: parsed.attachments.map(readAttachment),
});

const readAttachment = ({
  filename,
  contentType,
  size,
  content,
}: ParsedMail['attachments'][number]): Attachment => ({
  filename: filename ?? 'unnamed',
  contentType,
  size,
  contentBase64: content.toString('base64'),
});

/** For lists: without the HTML body and the content of attachments. */
export const summaryOf = ({ id, from, to, subject, text, receivedAt, attachments }: Message) => ({
  id,
  from,
  to,
  subject,
  text,
  receivedAt,
  attachments: attachments.map(({ filename, contentType, size }) => ({ filename, contentType, size })),
});
