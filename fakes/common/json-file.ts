import { existsSync, mkdirSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

/** One JSON document on disk. A write replaces the whole file in one step, so a crash leaves the old or the new one. */
export class JsonFile {
  constructor(private readonly path: string) {}

  /** The stored value, or undefined when nothing was written yet. */
  read(): unknown {
    if (!existsSync(this.path)) return undefined;
    const text = readFileSync(this.path, 'utf8');
    try {
      return JSON.parse(text);
    } catch {
      throw new Error(`${this.path} is not a readable state file; move it away to start empty`);
    }
  }

  write(value: unknown): void {
    mkdirSync(dirname(this.path), { recursive: true });
    const fresh = `${this.path}.${process.pid}.new`;
    writeFileSync(fresh, JSON.stringify(value), { mode: 0o600 });
    renameSync(fresh, this.path);
  }
}
