/**
 * Runs a fake by hand or as a child process: says where it is, and stops cleanly on Ctrl-C, on
 * SIGTERM, and when the process that started it goes away (its IPC channel closes).
 */
export function runUntilStopped(running: { lines: string[]; stop: () => Promise<void> }): void {
  for (const line of running.lines) console.log(line);
  let stopping = false;
  const stop = () => {
    if (stopping) return;
    stopping = true;
    running.stop().then(
      () => process.exit(0),
      (error: unknown) => {
        console.error(error);
        process.exit(1);
      },
    );
  };
  process.on('SIGINT', stop);
  process.on('SIGTERM', stop);
  process.on('disconnect', stop);
}
