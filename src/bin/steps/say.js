/** @param {string} [line] */
export function say(line = '') {
	process.stdout.write(`${line}\n`);
}

/**
 * What stops a command for a reason that a person can act on: its words are printed alone,
 * without a stack.
 */
export class Stop extends Error {}

/** @param {number} startedAtMs */
export function seconds(startedAtMs) {
	return `${((Date.now() - startedAtMs) / 1000).toFixed(1)} s`;
}

/**
 * The frame of both commands: an expected stop is one line, anything else keeps its stack.
 * @param {() => Promise<number | undefined>} command
 */
export async function carryOut(command) {
	try {
		process.exitCode = (await command()) ?? 0;
	} catch (error) {
		if (error instanceof Stop) process.stderr.write(`${error.message}\n`);
		else console.error(error);
		process.exitCode = 1;
	}
}
