/**
 * Runs `end` once, when somebody asks this process to stop: Ctrl-C, SIGTERM,
 * or the death of the npm that started it. npm passes signals on only while a plain `sh` lies
 * between, and cannot when it is killed outright; its death shows as a new parent.
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
