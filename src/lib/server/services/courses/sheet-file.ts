import { parse, YAMLParseError } from 'yaml';
import { draftFrom, type SheetDraft } from '$lib/domain/data-sheets/draft/draft';
import { inputProblem } from '$lib/domain/problem';

/**
 * A data sheet's file, as YAML or JSON, as if somebody had typed it. What is wrong in it comes
 * along, to be put right in its field; only what is no file of this kind is refused.
 */
export function readSheetFile(text: string): {
	written: Record<string, unknown>;
	draft: SheetDraft;
	leftOut: string[];
} {
	let written: unknown;
	try {
		written = parse(text);
	} catch (fault) {
		if (!(fault instanceof YAMLParseError)) throw fault;
		const line = fault.linePos?.[0].line;
		throw inputProblem({
			text: [`This cannot be read as YAML${line ? `: look at line ${line}` : ''}.`]
		});
	}
	if (written === null || typeof written !== 'object' || !('dimensions' in written))
		throw inputProblem({ text: ['This is no data sheet: there are no dimensions in it.'] });
	const { draft, leftOut } = draftFrom(written);
	return { written: written as Record<string, unknown>, draft, leftOut };
}
