interface Running {
  /** Printed once, when requests are answered. */
  readyLine: string;
  close(): Promise<void>;
}

/** Runs a stand-in as a program of its own: one line when ready, a clean end on SIGTERM or Ctrl-C. */
export async function runProgram(start: () => Promise<Running>): Promise<void> {
  try {
    const running = await start();
    process.stdout.write(`${running.readyLine}\n`);
    const stop = () => void running.close().then(() => process.exit(0));
    process.once('SIGTERM', stop);
    process.once('SIGINT', stop);
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
    process.exitCode = 1;
  }
}
