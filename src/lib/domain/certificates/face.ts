import { z } from 'zod';
import { evidenceSchema, taskSchema, type Evidence } from './evidence';
import { readCertificateCode } from './code';
import type { AwardRule, Verdict } from './rules/rule';
import { ruleName } from './rules/registry';

const line = z.string().trim().min(1).max(400);

/**
 * The facts of a certificate as they stood when it was awarded. Page, PDF and credential are
 * made from this and nothing else, so that they agree and never change.
 */
export const certificateFaceSchema = z.strictObject({
	format: z.literal(1),
	code: z.string().refine((code) => readCertificateCode(code) === code, 'not a certificate code'),
	personName: line,
	school: z.strictObject({ name: line, place: line.nullable() }),
	course: z.strictObject({ title: line, revision: line }),
	awardedOn: z.iso.date(),
	/** Who decided: never somebody who marked the work, where need be of another school. */
	decidedBy: z.strictObject({ name: line, schoolName: line }),
	outcomes: z.array(line),
	tasks: z.array(taskSchema.omit({ stepKey: true, decision: true })),
	quizzes: z.array(z.strictObject({ title: line, words: line })),
	benchMinutes: z.int().min(0),
	notAssessed: z.array(line),
	rule: z.strictObject({ name: line, words: line }),
	because: z.array(z.string().min(1).max(2000))
});

export type CertificateFace = z.infer<typeof certificateFaceSchema>;

type Occasion = Pick<
	CertificateFace,
	'code' | 'personName' | 'school' | 'course' | 'awardedOn' | 'decidedBy'
>;

/** @throws Error where the rule was not met: a certificate that stands on nothing cannot be made */
export function faceOf(
	occasion: Occasion,
	evidence: Evidence,
	rule: AwardRule,
	verdict: Verdict = rule.decide(evidenceSchema.parse(evidence))
): CertificateFace {
	if (!verdict.met) throw new Error(`The rule is not met: ${verdict.missing.join(' ')}`);
	return certificateFaceSchema.parse({
		format: 1,
		...occasion,
		outcomes: evidence.outcomes.map((outcome) => outcome.words),
		tasks: evidence.tasks
			.filter((task) => task.decision === 'competent')
			.map(({ title, engine, how, share, attempt, decidedOn }) => ({
				title,
				engine,
				how,
				share,
				attempt,
				decidedOn
			})),
		quizzes: evidence.quizzes
			.filter((quiz) => quiz.passed)
			.map(({ title, words }) => ({ title, words })),
		benchMinutes: evidence.bench.minutes,
		notAssessed: evidence.notAssessed,
		rule: { name: ruleName(rule), words: rule.words },
		because: verdict.because
	});
}

/** Stands on every certificate and on the page that checks it. */
export const certificateCaution =
	'This certificate says what was seen and judged on the days and engines named here. It is no licence to trade and no permission to work alone. On any engine, the maker’s service information, local codes and a licensed person’s judgement win.';

export function checkAddress(origin: string, code: string): string {
	return `${origin}/check/${code}`;
}
