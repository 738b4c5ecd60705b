/** Says where a fake is, and stops it cleanly on Ctrl-C and on SIGTERM. */
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
}
