import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { parse } from 'svelte/compiler';
import ts from 'typescript';

export const root = fileURLToPath(new URL('../..', import.meta.url));

/** One file of ours; `path` runs from the project's root. */
export type SourceFile = { path: string; trees: ts.SourceFile[]; text: string };

export type Import = {
	/** As written. */
	specifier: string;
	/** The file of ours that it means, where it is one. */
	target?: string;
	/** Leaves nothing behind at run time. */
	typeOnly: boolean;
};

export function sourceOf(path: string, text: string): SourceFile {
	const scripts = path.endsWith('.svelte') ? scriptsOf(text) : [text];
	const kind = path.endsWith('.js') ? ts.ScriptKind.JS : ts.ScriptKind.TS;
	const trees = scripts.map((script) =>
		ts.createSourceFile(path, script, ts.ScriptTarget.Latest, true, kind)
	);
	return { path, trees, text };
}

/** The scripts of a component, and its markup's own imports as one more. */
function scriptsOf(text: string): string[] {
	const ast = parse(text, { modern: true });
	const positions = [ast.module?.content, ast.instance?.content].flatMap((program) => {
		const at = program as { start?: number; end?: number } | undefined;
		return at?.start === undefined || at.end === undefined ? [] : [[at.start, at.end] as const];
	});
	const inMarkup = text.match(/\bimport\(\s*(['"]).+?\1\s*\)/g) ?? [];
	return [...positions.map(([start, end]) => text.slice(start, end)), inMarkup.join(';')];
}

let read: SourceFile[] | undefined;

/** Every TypeScript, JavaScript and Svelte file under src, read once a run. */
export function sourceFiles(): SourceFile[] {
	read ??= readdirSync(join(root, 'src'), { recursive: true, withFileTypes: true })
		.filter((one) => one.isFile() && /\.(ts|js|svelte)$/.test(one.name))
		.map((one) => relative(root, join(one.parentPath, one.name)))
		.sort()
		.map((path) => sourceOf(path, readFileSync(join(root, path), 'utf8')));
	return read;
}

export function walk(tree: ts.Node, see: (node: ts.Node) => void): void {
	see(tree);
	ts.forEachChild(tree, (child) => walk(child, see));
}

export function importsOf(file: SourceFile): Import[] {
	const found: Import[] = [];
	const add = (specifier: ts.Node | undefined, typeOnly: boolean) => {
		if (!specifier || !ts.isStringLiteralLike(specifier)) return;
		found.push({
			specifier: specifier.text,
			target: targetOf(file.path, specifier.text),
			typeOnly
		});
	};
	for (const tree of file.trees)
		walk(tree, (node) => {
			if (ts.isImportDeclaration(node)) add(node.moduleSpecifier, onlyTypes(node.importClause));
			else if (ts.isExportDeclaration(node)) add(node.moduleSpecifier, node.isTypeOnly);
			else if (ts.isImportTypeNode(node) && ts.isLiteralTypeNode(node.argument))
				add(node.argument.literal, true);
			else if (ts.isCallExpression(node) && node.expression.kind === ts.SyntaxKind.ImportKeyword)
				add(node.arguments[0], false);
		});
	return found;
}

function onlyTypes(clause: ts.ImportClause | undefined): boolean {
	if (!clause) return false;
	if (clause.isTypeOnly) return true;
	const names = clause.namedBindings;
	return (
		!clause.name &&
		names !== undefined &&
		ts.isNamedImports(names) &&
		names.elements.length > 0 &&
		names.elements.every((one) => one.isTypeOnly)
	);
}

const endings = ['', '.ts', '.js', '.svelte', '/index.ts', '/index.js'];

/** Undefined for packages, for what SvelteKit makes up and for files that are no source. */
export function targetOf(from: string, specifier: string): string | undefined {
	const bare = specifier.replace(/\?.*$/, '');
	const base = bare.startsWith('.')
		? join(dirname(from), bare)
		: bare.startsWith('$lib/')
			? join('src/lib', bare.slice('$lib/'.length))
			: undefined;
	if (base === undefined) return undefined;
	const ending = endings.find(
		(one) => /\.(ts|js|svelte)$/.test(base + one) && existsSync(join(root, base + one))
	);
	return ending === undefined ? base : base + ending;
}
