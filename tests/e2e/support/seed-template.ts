import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from '../../../src/bin/steps/build.js';
import { startSite } from './server';

/** Once a run: a build that is current, and the demo seeded into a folder that every site copies. */
export default async function seedTemplate() {
	await build();
	const template = await mkdtemp(join(tmpdir(), 'ringland-template-'));
	const clean = () => rm(template, { recursive: true, force: true });
	try {
		const site = await startSite({ dataDir: template });
		await site.stop();
	} catch (error) {
		await clean();
		throw error;
	}
	process.env.RINGLAND_TEMPLATE = template;
	return clean;
}
