/** What a letter is made of: written once, shown as plain text and as HTML. */
export type Block =
	| { kind: 'words'; words: string }
	| { kind: 'link'; words: string; to: string }
	| { kind: 'list'; lines: readonly string[] }
	| { kind: 'figure'; label: string; value: string }
	| { kind: 'small'; words: string };

export const words = (text: string): Block => ({ kind: 'words', words: text });
export const link = (text: string, to: string): Block => ({ kind: 'link', words: text, to });
export const list = (lines: readonly string[]): Block => ({ kind: 'list', lines });
export const figure = (label: string, value: string): Block => ({ kind: 'figure', label, value });
export const small = (text: string): Block => ({ kind: 'small', words: text });

export function blocksAsText(blocks: readonly Block[]): string {
	return blocks.map(asText).join('\n\n') + '\n';
}

function asText(block: Block): string {
	switch (block.kind) {
		case 'words':
		case 'small':
			return block.words;
		case 'link':
			return `${block.words}:\n${block.to}`;
		case 'list':
			return block.lines.map((line) => `- ${line}`).join('\n');
		case 'figure':
			return `${block.label}: ${block.value}`;
	}
}
