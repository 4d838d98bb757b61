import process from 'node:process';

// Loaded into the served application: when whoever started it is gone without having stopped it (killed, say),
// their end of the channel closes, and it ends too.
process.on('disconnect', () => {
  process.kill(process.pid, 'SIGTERM');
  setTimeout(() => process.exit(1), 5000).unref();
});
