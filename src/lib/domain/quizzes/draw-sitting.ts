import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { seeded, type Random } from '$lib/kernel/random/random';
import type { KindName } from '../questions/kind-names';
import type { Quiz, QuizLine } from './schema';

/** A question that may be drawn: what a plan needs to know of it. */
export type Drawable = { key: string; outcome: string; kind: KindName; practiceOnly?: true };
export type SittingItem = { place: number; key: string; seed: string };

/**
 * Draws one sitting. A named question is always in; a line that draws spreads evenly over what it
 * leaves open (outcomes, then kinds), and takes questions that this student has not had before it
 * takes one again. The seed is the caller's; the same seed and pool give the same sitting.
 */
export function drawSitting(
	quiz: Pick<Quiz, 'plan' | 'order'>,
	pool: readonly Drawable[],
	seed: string,
	hadBefore: readonly string[] = []
): Outcome<SittingItem[]> {
	const random = seeded(`${seed}/plan`);
	const taken: string[] = [];
	for (const line of quiz.plan)
		if ('question' in line) {
			if (!pool.some((one) => one.key === line.question))
				return cannot(`the question ${line.question} is not published`);
			taken.push(line.question);
		}
	if (new Set(taken).size < taken.length) return cannot('the plan names a question twice');
	const byLine = new Map<QuizLine, string[]>();
	for (const line of quiz.plan) {
		if (!('draw' in line)) continue;
		const free = pool.filter((one) => fits(line, one) && !taken.includes(one.key));
		if (free.length < line.draw)
			return cannot(
				`the plan draws ${line.draw} ${lineWords(line)}, and ${free.length} are published`
			);
		const drawn = spread(free, line.draw, hadBefore, random);
		byLine.set(line, drawn);
		taken.push(...drawn);
	}
	const planned = quiz.plan.flatMap((line) =>
		'question' in line ? [line.question] : (byLine.get(line) ?? [])
	);
	const ordered = quiz.order === 'shuffled' ? random.shuffle(planned) : planned;
	return computed(ordered.map((key, i) => ({ place: i + 1, key, seed: `${seed}/${key}` })));
}

function fits(line: Extract<QuizLine, { draw: number }>, one: Drawable): boolean {
	return (
		!one.practiceOnly &&
		(line.outcome === undefined || line.outcome === one.outcome) &&
		(line.kind === undefined || line.kind === one.kind)
	);
}

function lineWords(line: Extract<QuizLine, { draw: number }>): string {
	return [line.kind, line.outcome && `on ${line.outcome}`].filter(Boolean).join(' ');
}

/** Takes from the outcome and kind that has given least so far, new questions before old ones. */
function spread(
	free: readonly Drawable[],
	count: number,
	hadBefore: readonly string[],
	random: Random
): string[] {
	const given = new Map<string, number>();
	const cost = (one: Drawable) =>
		(hadBefore.includes(one.key) ? 1000 : 0) +
		10 * (given.get(`outcome ${one.outcome}`) ?? 0) +
		(given.get(`kind ${one.kind}`) ?? 0);
	const left = random.shuffle(free);
	const out: string[] = [];
	while (out.length < count) {
		const next = left.reduce((best, one) => (cost(one) < cost(best) ? one : best));
		left.splice(left.indexOf(next), 1);
		for (const name of [`outcome ${next.outcome}`, `kind ${next.kind}`])
			given.set(name, (given.get(name) ?? 0) + 1);
		out.push(next.key);
	}
	return out;
}
