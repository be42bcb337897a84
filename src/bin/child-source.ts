import { fileURLToPath } from 'node:url';
import { build, type Plugin } from 'vite';

/**
 * `import source from './entry?child'` gives the entry and everything of ours that it imports
 * as one string of JavaScript, packages left out. A child process runs that string, so that
 * heavy work needs no file beside the built server, and the same import serves dev, tests and
 * production. (A file beside the server was tried in thought: the adapter bundles the server a
 * second time and copies nothing that it does not itself reach.)
 */
export function childSource(): Plugin {
	const suffix = '?child';
	return {
		name: 'child-source',
		enforce: 'pre',
		async resolveId(id, importer) {
			if (!id.endsWith(suffix)) return undefined;
			const entry = await this.resolve(id.slice(0, -suffix.length), importer);
			return entry && entry.id + suffix;
		},
		async load(id) {
			if (!id.endsWith(suffix)) return undefined;
			const entry = id.slice(0, -suffix.length);
			const bundle = await bundled(entry);
			for (const file of bundle.files) if (!file.startsWith('\0')) this.addWatchFile(file);
			return `export default ${JSON.stringify(bundle.code)};`;
		}
	};
}

async function bundled(entry: string): Promise<{ code: string; files: string[] }> {
	const made = await build({
		configFile: false,
		envFile: false,
		logLevel: 'error',
		resolve: { alias: { $lib: fileURLToPath(new URL('../lib', import.meta.url)) } },
		build: {
			ssr: entry,
			write: false,
			target: 'node20',
			minify: false,
			rolldownOptions: { output: { format: 'es', codeSplitting: false } }
		}
	});
	const output = Array.isArray(made) ? made[0]?.output : 'output' in made ? made.output : undefined;
	const chunks = (output ?? []).flatMap((one) => (one.type === 'chunk' ? [one] : []));
	const [only] = chunks;
	if (!only || chunks.length !== 1) throw new Error(`${entry} must bundle to one chunk`);
	return { code: only.code, files: only.moduleIds };
}
