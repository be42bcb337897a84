import type { Quiz } from './schema';
import type { SittingScore } from './score-sitting';

export type QuizResult = { passed: boolean; words: string };

/** The pass rule, and that it is a rule: the page prints the words beside the mark. */
export function resultOf(
	score: Pick<SittingScore, 'points' | 'of' | 'share'>,
	quiz: Pick<Quiz, 'cutScore'>
): QuizResult {
	// A share is rounded to a millionth; so is the comparison, or 7 of 10 could miss 70 %.
	const passed = score.share >= quiz.cutScore - 1e-6;
	const got = `${figure(score.points)} of ${score.of} points, ${percent(score.share)}`;
	const rule = `The cut score is ${percent(quiz.cutScore)}`;
	return {
		passed,
		words: passed ? `Passed: ${got}. ${rule}.` : `Not passed: ${got}. ${rule}.`
	};
}

export function passRuleWords(quiz: Pick<Quiz, 'cutScore'>, questions: number): string {
	return `You pass with ${figure(Math.ceil(quiz.cutScore * questions * 100 - 1e-6) / 100)} of ${questions} points, which is ${percent(quiz.cutScore)}.`;
}

/** Rounded down like the share beside it. */
function figure(value: number): string {
	return String(Math.floor(value * 100 + 1e-6) / 100);
}

/** Rounded down: 69.96 % must not read as the 70 % that would have passed. */
function percent(share: number): string {
	return `${Math.floor(share * 1000 + 1e-6) / 10} %`;
}
