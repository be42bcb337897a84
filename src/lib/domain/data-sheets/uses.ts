import type { JobSheet } from '../job-sheets/schema';
import { kindOf } from '../questions/registry';
import type { Question } from '../questions/schema';

/** Something that a school teaches from a data sheet, and the values of the sheet in it. */
export type Use = {
	kind: 'lesson' | 'question' | 'job-sheet';
	key: string;
	title: string;
	sheetKeys: string[];
};
export type Taught = {
	lessons: readonly { key: string; title: string; sheetKeys: readonly string[] }[];
	questions: readonly Question[];
	jobSheets: readonly JobSheet[];
};

/** Who uses which values of a sheet. */
export function usesOf({ lessons, questions, jobSheets }: Taught): Use[] {
	return [
		...lessons.map((one) => ({ ...one, kind: 'lesson' as const, sheetKeys: [...one.sheetKeys] })),
		...questions.map((one) => ({
			kind: 'question' as const,
			key: one.key,
			title: questionTitle(one),
			sheetKeys: keysOfQuestion(one)
		})),
		...jobSheets.map((one) => ({
			kind: 'job-sheet' as const,
			key: one.key,
			title: one.title,
			sheetKeys: keysOfJobSheet(one)
		}))
	];
}

export function keysOfQuestion(question: Question): string[] {
	return [...new Set(kindOf(question.kind).sheetKeys(question.body))];
}

export function keysOfJobSheet({ grids, results }: JobSheet): string[] {
	return [...new Set([...grids.map((one) => one.dimension), ...results.map((one) => one.limit)])];
}

/** A question has no title: its own words, or its key in words. */
function questionTitle({ key, body }: Question): string {
	const prompt = 'prompt' in body && typeof body.prompt === 'string' ? body.prompt : undefined;
	const plain = prompt?.replace(/\{[^}]*\}/g, '…').trim() ?? key.replaceAll('-', ' ');
	return plain.length > 110 ? `${plain.slice(0, 108).trimEnd()} …` : plain;
}
