import { build } from './steps/build.js';
import { whenAsked } from './steps/ending.js';
import { startFakes } from './steps/fakes.js';
import { install } from './steps/install.js';
import { tryPort } from './steps/ports.js';
import { endRunning } from './steps/run.js';
import { carryOut, say, seconds, Stop } from './steps/say.js';
import { ready, serve, serveWithReload } from './steps/serve.js';
import { settingsFrom } from './steps/settings.js';
import { welcome } from './steps/welcome.js';

/**
 * `npm start`: from whatever state the checkout is in to a running server. Plain JavaScript with
 * no package, because it runs before there are any. `--dev` serves with reload.
 */
await carryOut(async () => {
	const startedAtMs = Date.now();
	const dev = process.argv.includes('--dev');
	/** @type {import('./steps/serve.js').Running[]} */
	const running = [];
	let asked = false;
	whenAsked(async () => {
		asked = true;
		endRunning();
		// The server first: what it still sends on its way out reaches the fakes.
		for (const one of running.toReversed()) await one.end();
		process.exit(running.length > 0 ? 0 : 130);
	});

	const settings = settingsFrom(process.env);
	await portsAreFree(settings);
	await install();
	const folder = dev ? '' : await build();
	await portsAreFree(settings);
	try {
		running.push(...(await startFakes(settings)));
		const server = dev ? serveWithReload(settings) : serve(settings, folder);
		running.push(server);
		await ready(settings, server);
		for (const line of welcome(settings)) say(line);
		say(`Ready after ${seconds(startedAtMs)}. Ctrl-C ends it.`);
		await Promise.race(running.map((one) => one.gone));
		if (asked) return new Promise(() => {});
		throw new Stop('A part of Ringland ended by itself (see above). Start it again.');
	} catch (error) {
		if (asked) return new Promise(() => {});
		for (const one of running.toReversed()) await one.end();
		throw error;
	}
});

/** @param {import('./steps/settings.js').Settings} settings */
async function portsAreFree({ host, port, mailbox, till }) {
	const server = await tryPort(host, port);
	if (server === 'EADDRINUSE')
		throw new Stop(
			`Port ${port} is in use. Stop what uses it, or start with another: PORT=4280 npm start`
		);
	if (typeof server === 'string')
		throw new Stop(`Cannot listen on ${host} port ${port} (${server}). Set HOST and PORT.`);
	const more = [mailbox?.smtpPort, mailbox?.pagePort, till?.port].filter(
		(one) => one !== undefined
	);
	for (const one of more)
		if (typeof (await tryPort('127.0.0.1', one)) === 'string')
			throw new Stop(
				`Port ${one} is in use; the local mailbox and till take the three ports after PORT. Start with another: PORT=4280 npm start`
			);
}
