/**
 * A fake as a process of its own: settings come over the line from the parent, and it ends with
 * the parent or at its word. Ctrl-C goes to every process of a terminal; a fake leaves that to
 * the parent, so that what the server still sends on its way out arrives.
 * @template Settings
 * @param {(settings: Settings) => Promise<{ close: () => Promise<void> }>} start
 */
export function runAsChild(start) {
	process.on('SIGINT', () => {});
	process.once('message', async (settings) => {
		try {
			const fake = await start(/** @type {Settings} */ (settings));
			const end = () => void fake.close().finally(() => process.exit(0));
			process.once('SIGTERM', end);
			process.once('disconnect', end);
			process.send?.('listening');
		} catch (error) {
			const because = error instanceof Error ? error.message : String(error);
			process.send?.({ because }, () => process.exit(1));
		}
	});
}
