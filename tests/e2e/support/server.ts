import { openSync, readFileSync } from 'node:fs';
import { cp, mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startFakes } from '../../../src/bin/steps/fakes.js';
import { freePorts } from '../../../src/bin/steps/ports.js';
import { inProject } from '../../../src/bin/steps/project.js';
import { secretsIn } from '../../../src/bin/steps/secrets.js';
import { ready, serve, type Running } from '../../../src/bin/steps/serve.js';
import { settingsFrom } from '../../../src/bin/steps/settings.js';

/** The production server with its stand-ins, on ports and in a folder of its own. */
export type Site = {
	origin: string;
	dataDir: string;
	mailboxUrl: string;
	till: Till;
	/** What the server has printed so far. */
	log: () => string;
	/** As a power cut does; the stand-ins stay. */
	killServer: () => Promise<void>;
	/** On the same port and data, after the server ended. */
	startServer: () => Promise<void>;
	stop: () => Promise<void>;
};

export type Till = {
	url: string;
	events: () => Promise<{ id: string; type: string }[]>;
	/** While held, no webhook leaves. */
	hold: (on: boolean) => Promise<void>;
	/** Sends these again in this order; gives the server's answers. */
	resend: (eventIds: string[]) => Promise<number[]>;
};

type Wanted = {
	/** A data folder to start from a copy of; nothing otherwise. */
	template?: string;
	/** Where the data lie instead of a folder that goes away with the site. */
	dataDir?: string;
	environment?: Record<string, string>;
};

export async function startSite({ template, dataDir, environment = {} }: Wanted): Promise<Site> {
	const folder = dataDir ?? (await mkdtemp(join(tmpdir(), 'ringland-site-')));
	const logFile = join(folder, 'server.log');
	const isOld = (path: string) => path === join(template ?? '', 'server.log');
	if (template) await cp(template, folder, { recursive: true, filter: (path) => !isOld(path) });
	const [port = 0, smtp, page, till] = await freePorts(4);
	const settings = settingsFrom(
		{ ...quietEnvironment(), PORT: String(port), DATA_DIR: folder, ...environment },
		{ smtp, page, till }
	);
	const fakes = await startFakes(settings);
	let server: Running | undefined;

	async function startServer() {
		const out = openSync(logFile, 'a');
		server = serve(settings, inProject('build'), ['ignore', out, out, 'ipc']);
		await ready(settings, server).catch((error: unknown) => {
			throw new Error(`${String(error)}\n${readFileSync(logFile, 'utf8').slice(-4000)}`);
		});
	}
	async function stop() {
		await server?.end();
		await Promise.all(fakes.map((fake) => fake.end()));
		if (!dataDir) await rm(folder, { recursive: true, force: true });
	}
	await startServer().catch(async (error: unknown) => {
		await stop();
		throw error;
	});
	return {
		origin: settings.origin,
		dataDir: folder,
		mailboxUrl: `http://127.0.0.1:${page}`,
		till: tillAt(`http://127.0.0.1:${till}`, secretsIn(folder).stripeSecretKey),
		log: () => readFileSync(logFile, 'utf8'),
		async killServer() {
			server?.child.kill('SIGKILL');
			await server?.gone;
		},
		startServer,
		stop
	};
}

function tillAt(url: string, secretKey: string): Till {
	const hook = async (name: string, body: unknown = {}) => {
		const response = await fetch(`${url}/fake/${name}`, {
			method: 'POST',
			headers: { authorization: `Bearer ${secretKey}` },
			body: JSON.stringify(body)
		});
		if (!response.ok) throw new Error(`The till said ${response.status} to ${name}.`);
		return response.json();
	};
	return {
		url,
		events: () => hook('events'),
		hold: async (on) => void (await hook('hold', { on })),
		resend: async (eventIds) => (await hook('resend', { eventIds })).statuses
	};
}

/** The test's own surroundings, without settings of a server that may run beside. */
function quietEnvironment(): Record<string, string> {
	const { PATH = '', HOME = '', TMPDIR } = process.env;
	return { PATH, HOME, LOG_LEVEL: 'info', ...(TMPDIR ? { TMPDIR } : {}) };
}
