import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './source-files';

/** A document may shorten a path as the house's plan does. */
const bases = ['', 'src', 'src/lib', 'src/lib/server', 'tests'];
const endings = /\.(ts|js|svelte|svx|css|html|json|ya?ml|vtt|md|png|webp|svg|sh)$/;

/** The paths that a Markdown text names, in code spans, links and pictures. */
export function pathsNamedIn(markdown: string): string[] {
	const prose = markdown.replaceAll(/^(```|~~~)[\s\S]*?^\1/gm, '');
	const spans = [...prose.matchAll(/`([^`\n]+)`/g)].map(([, inside]) => inside ?? '');
	const links = [...prose.matchAll(/\]\(([^)\s#]+)[^)]*\)/g)]
		.map(([, target]) => target ?? '')
		.filter((target) => !/^(https?|mailto):/.test(target));
	return [...new Set([...spans.filter(looksLikePath), ...links])];
}

function looksLikePath(span: string): boolean {
	if (!/^[\w.@()[\]*+$-]+(\/[\w.@()[\]*+$-]+)*\/?$/.test(span) || span.startsWith('@'))
		return false;
	if (!span.includes('/')) return endings.test(span) && !span.includes('*');
	const [first = ''] = span.split('/');
	return endings.test(span) || topFolders().has(first);
}

let folders: Set<string> | undefined;
function topFolders(): Set<string> {
	folders ??= new Set(
		bases
			.filter((base) => existsSync(join(root, base)))
			.flatMap((base) => readdirSync(join(root, base), { withFileTypes: true }))
			.filter((one) => one.isDirectory() && one.name !== 'node_modules')
			.map((one) => one.name)
	);
	return folders;
}

/** Made by the commands, so absent from a fresh clone. */
const made =
	/^(\.\/)?(data|build|build-[^/]*|node_modules|test-results|playwright-report|\.svelte-kit)(\/|$)/;

/** A `*` or an `<x>` stands for anything, so what lies before it must exist. */
export function isThere(path: string): boolean {
	if (made.test(path)) return true;
	const fixed = path
		.split('/')
		.reduce<{ parts: string[]; open: boolean }>(
			({ parts, open }, part) =>
				open || part.includes('*')
					? { parts, open: true }
					: { parts: [...parts, part], open: false },
			{ parts: [], open: false }
		);
	return bases.some((base) => existsSync(join(root, base, ...fixed.parts)));
}

/** The first cells of every table under the heading whose words these are. */
export function tableUnder(markdown: string, heading: RegExp): string[][] {
	const lines = markdown.split('\n');
	const from = lines.findIndex((line) => /^#+ /.test(line) && heading.test(line));
	if (from < 0) return [];
	const depth = /^#+/.exec(lines[from] ?? '')?.[0].length ?? 1;
	const rest = lines.slice(from + 1);
	const to = rest.findIndex((line) => (/^(#+) /.exec(line)?.[1]?.length ?? 99) <= depth);
	return rest
		.slice(0, to < 0 ? undefined : to)
		.filter((line) => /^\|/.test(line) && !/^\|[\s:|-]+$/.test(line))
		.map((line) =>
			line
				.split(/(?<!\\)\|/)
				.slice(1, -1)
				.map((cell) => cell.trim())
		);
}
