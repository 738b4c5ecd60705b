/*
 * Loaded ahead of every process of the stack: when whoever started it goes away without a word
 * (its IPC channel closes), the process gets the SIGTERM that it would have been sent.
 */
process.on('disconnect', () => process.kill(process.pid, 'SIGTERM'));
process.channel?.unref();
