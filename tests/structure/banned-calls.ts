import ts from 'typescript';
import { walk, type SourceFile } from './source-files';

type Ban = {
	words: string;
	/** Where it is banned. */
	where: RegExp;
	/** Where it is at home all the same. */
	except?: RegExp;
	is: (node: ts.Node, written: string) => boolean;
};

const impure = new Set([
	'Date.now',
	'Math.random',
	'performance.now',
	'crypto.getRandomValues',
	'crypto.randomUUID',
	'fetch',
	'setTimeout',
	'setInterval',
	'queueMicrotask'
]);
const rebuilding = ['removeColumn', 'changeColumn', 'renameColumn', 'removeConstraint'];
const pure = /^src\/lib\/(kernel|domain)\//;

const bans: Ban[] = [
	{
		words: 'the pure layers take time and chance as arguments',
		where: pure,
		is: (node, written) =>
			(ts.isCallExpression(node) && (impure.has(calls(node)) || calls(node) === 'Date')) ||
			(ts.isNewExpression(node) && node.arguments?.length === 0 && /^new Date\b/.test(written))
	},
	{
		words: 'the environment is read in config/env.ts and nowhere else',
		where: /^src\//,
		except: /^src\/(lib\/server\/config\/env\.ts|bin\/.*\.js)$/,
		is: (node, written) => ts.isPropertyAccessExpression(node) && written === 'process.env'
	},
	{
		words: 'the pure layers know no process',
		where: pure,
		is: (node) => ts.isPropertyAccessExpression(node) && node.expression.getText() === 'process'
	},
	{
		words: 'data/transaction.ts is the only one that opens a transaction',
		where: /^src\/lib\/server\//,
		except: /^src\/lib\/server\/data\/transaction\.ts$/,
		is: (node) => ts.isCallExpression(node) && /sequelize\)?\??\.transaction$/i.test(calls(node))
	},
	{
		words: 'it rebuilds the table, which was seen to delete child rows and drop indexes',
		where: /^src\/lib\/server\//,
		is: (node) => ts.isPropertyAccessExpression(node) && rebuilding.includes(node.name.text)
	},
	{
		words: 'words of one database belong to data/dialect',
		where: /^src\/lib\/server\//,
		except: /^src\/lib\/server\/data\/dialect\//,
		is: (node) =>
			(ts.isStringLiteralLike(node) || ts.isTemplateExpression(node)) &&
			/\bPRAGMA\b|\bsqlite_(master|schema)\b/.test(node.getText())
	},
	{
		words: 'only content globs',
		where: /^src\//,
		except: /^src\/lib\/content\//,
		is: (node, written) => ts.isPropertyAccessExpression(node) && written === 'import.meta.glob'
	}
];

const calls = (node: ts.CallExpression) => node.expression.getText();

/** What a file calls that is banned where it lies, with its line. */
export function bannedCalls(file: SourceFile): string[] {
	const here = bans.filter(
		({ where, except }) => where.test(file.path) && !except?.test(file.path)
	);
	if (here.length === 0) return [];
	const found: string[] = [];
	for (const tree of file.trees)
		walk(tree, (node) => {
			const written = node.getText(tree);
			for (const ban of here)
				if (ban.is(node, written)) found.push(`${file.path}: ${firstLine(written)}: ${ban.words}`);
		});
	return found;
}

const firstLine = (text: string) => text.split('\n', 1)[0]?.slice(0, 80);
