/**
 * Loaded before the built server (`node --import`): when the process that started it is gone,
 * even by SIGKILL, the line between them breaks and the server ends as if asked to.
 */
if (process.channel) {
	process.once('disconnect', () => process.kill(process.pid, 'SIGTERM'));
	process.channel.unref();
}
