/**
 * Runs `end` once, when somebody asks this process to stop: Ctrl-C, SIGTERM, or the death of the
 * npm that started it, which shows as a new parent. The scripts in package.json begin with `exec`:
 * the shell that npm starts would otherwise lie between, die of the signal that npm passes on,
 * and npm would be gone before an open request is finished.
 * @param {() => Promise<void>} end
 */
export function whenAsked(end) {
	let asked = false;
	const once = () => {
		if (asked) return;
		asked = true;
		clearInterval(watch);
		void end();
	};
	// Not SIGHUP: listening to it would undo `nohup`.
	for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, once);
	const parent = process.ppid;
	const underNpm = process.env.npm_lifecycle_event !== undefined;
	const watch = setInterval(() => underNpm && process.ppid !== parent && once(), 500);
	watch.unref();
}
