import type { JsonFile } from '../common/json-file';

export interface Attachment {
  filename: string;
  contentType: string;
  /** Bytes. */
  size: number;
  contentBase64: string;
}

export interface Message {
  id: string;
  from: string;
  to: string[];
  subject: string;
  text: string;
  html: string | null;
  receivedAt: string;
  attachments: Attachment[];
}

const KEPT = 1000;

/** The mail caught so far, newest first; beyond the limit the oldest go. */
export class Mailbox {
  private messages: Message[];

  constructor(
    private readonly file?: JsonFile,
    private readonly limit = KEPT,
  ) {
    const saved = file?.read();
    this.messages = Array.isArray(saved) ? saved.filter(isMessage) : [];
  }

  add(message: Message): void {
    this.messages = [message, ...this.messages].slice(0, this.limit);
    this.file?.write(this.messages);
  }

  all(): readonly Message[] {
    return this.messages;
  }

  find(id: string): Message | undefined {
    return this.messages.find((message) => message.id === id);
  }

  clear(): void {
    this.messages = [];
    this.file?.write(this.messages);
  }
}

const isMessage = (value: unknown): value is Message =>
  typeof value === 'object' && value !== null && 'id' in value && 'attachments' in value;
