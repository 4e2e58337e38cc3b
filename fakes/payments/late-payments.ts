/** Wakes `finish` for each late payment when its time has come. */
export class LatePayments {
  private readonly timers = new Map<string, NodeJS.Timeout>();

  constructor(private readonly finish: (sessionId: string) => void) {}

  schedule(sessionId: string, dueAtMs: number): void {
    const timer = setTimeout(() => this.finishNow(sessionId), Math.max(0, dueAtMs - Date.now()));
    this.timers.set(sessionId, timer);
  }

  finishNow(sessionId: string): void {
    clearTimeout(this.timers.get(sessionId));
    this.timers.delete(sessionId);
    this.finish(sessionId);
  }

  stop(): void {
    this.timers.forEach((timer) => clearTimeout(timer));
  }
}
