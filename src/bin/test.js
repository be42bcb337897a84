import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from './steps/build.js';
import { whenAsked } from './steps/ending.js';
import { install } from './steps/install.js';
import { found, readyMachine } from './steps/machine.js';
import { brought, endRunning, run } from './steps/run.js';
import { carryOut, say, seconds, Stop } from './steps/say.js';
import { playwrightCounts, single, tally, vitestCounts } from './steps/tally.js';

/**
 * `npm test`: everything that a change must pass, from a fresh clone. Every stage runs even when
 * an earlier one failed, so that the last line counts all there is to mend. Format, lint, types
 * and build count as one each, every test of vitest and Playwright as itself.
 */
await carryOut(async () => {
	const startedAtMs = Date.now();
	const reports = mkdtempSync(join(tmpdir(), 'ringland-reports-'));
	const done = () => rmSync(reports, { recursive: true, force: true });
	whenAsked(async () => {
		endRunning();
		done();
		process.exit(130);
	});
	const env = ownEnvironment();
	const { stage, total } = tally();

	await Promise.all([install(), readyMachine()]);
	await run(brought('svelte-kit'), ['sync'], { env, quiet: true });

	await stage('structure', () => vitest(['tests/structure'], 'structure'));
	await Promise.all([
		stage('format', () => holds('prettier', ['--check', '--log-level', 'warn', '.'])),
		stage('lint', () => holds('eslint', ['.']))
	]);
	await stage('types', () =>
		holds('svelte-check', ['--tsconfig', './tsconfig.json', '--output', 'human'])
	);
	await stage('unit and integration', () => vitest(['--exclude', 'tests/structure/**'], 'unit'));
	const built = await stage('build', buildOrSay);
	await stage('end to end', () => endToEnd(built));

	done();
	say(`Took ${seconds(startedAtMs)}.`);
	if (total.skipped > 0) say(`${total.skipped} skipped (named above).`);
	say(`${total.passed} passed, ${total.failed} failed`);
	return total.failed > 0 ? 1 : 0;

	/** @param {string} name @param {string[]} words */
	async function holds(name, words) {
		const { code, output } = await run(brought(name), words, { env, quiet: true });
		if (code !== 0) say(`-- ${name}\n${output.trimEnd()}`);
		return single(code === 0);
	}

	/** @param {string[]} words @param {string} name */
	async function vitest(words, name) {
		const file = join(reports, `${name}.json`);
		const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${file}`];
		const { code } = await run(brought('vitest'), ['run', ...words, ...reporters], { env });
		return vitestCounts(file, code);
	}

	async function buildOrSay() {
		try {
			await build();
			return single(true);
		} catch (error) {
			if (!(error instanceof Stop)) throw error;
			say(error.message);
			return single(false);
		}
	}

	/** @param {boolean} built */
	async function endToEnd(built) {
		if (!built || !found('chromium')) {
			say(
				`Not run: ${built ? 'there is no chromium' : 'there is no build'}. Counted as one failure.`
			);
			return single(false);
		}
		const file = join(reports, 'end-to-end.json');
		const { code } = await run(brought('playwright'), ['test', '--reporter=list,json'], {
			env: { ...env, PLAYWRIGHT_JSON_OUTPUT_NAME: file }
		});
		return playwrightCounts(file, code);
	}
});

/** The settings of a server that runs beside must not reach the tests. */
function ownEnvironment() {
	const env = { ...process.env };
	for (const key of Object.keys(env))
		if (
			/^(HOST|PORT|ORIGIN|DATA_DIR|DEMO|WORKER|NODE_ENV|AUTH_SECRET|MAIL.*|SMTP_.*|STRIPE_.*|TILL_.*|ADDRESS_HEADER|XFF_DEPTH|LOG_LEVEL)$/.test(
				key
			)
		)
			Reflect.deleteProperty(env, key);
	return env;
}
