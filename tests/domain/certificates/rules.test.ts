import { describe, expect, it } from 'vitest';
import type { Evidence } from '$lib/domain/certificates/evidence';
import { certificateFaceSchema, faceOf } from '$lib/domain/certificates/face';
import { evidenceComplete } from '$lib/domain/certificates/rules/evidence-complete';
import { awardRule, awardRules, ruleName } from '$lib/domain/certificates/rules/registry';
import { dayWords, hoursWords, howWords } from '$lib/domain/certificates/words';
import { evidence, face, occasion } from './example';

describe('evidence-complete', () => {
	it('is met by complete evidence, and says on what it stands', () => {
		expect(evidenceComplete.decide(evidence)).toEqual({
			met: true,
			because: [
				'Both lessons were read.',
				'Quiz Torque and clearances. Passed: 9 of 10 points, 90 %. The cut score is 70 %.',
				'Job sheet Measure a crankpin, on AV3-1150, stand 4, alone: competent at attempt 2, 4 March 2026.',
				'Job sheet Argue a spun shell to its cause, on AV3-1150, stand 2, in a pair (took the readings of pins 1 and 3): competent at attempt 1, 18 March 2026.',
				'12 h 30 min at the bench recorded; the course asks for 12 h.',
				'Each of the 3 outcomes was shown by a finished step.'
			],
			missing: []
		});
	});

	const but = (change: (draft: Evidence) => void) => {
		const draft = structuredClone(evidence);
		change(draft);
		return evidenceComplete.decide(draft);
	};
	const state = (draft: Evidence, key: string, to: Evidence['steps'][number]['state']) => {
		for (const step of draft.steps) if (step.key === key) step.state = to;
	};

	it.each<[string, (draft: Evidence) => void, string[]]>([
		[
			'a lesson is open',
			(draft) => state(draft, 'pins', 'under-way'),
			['Lesson not finished: Crankpins and clearances.']
		],
		[
			'a quiz was not passed',
			(draft) =>
				(draft.quizzes = draft.quizzes.map((quiz) => ({
					...quiz,
					passed: false,
					words: 'Not passed: 5 of 10 points, 50 %.'
				}))),
			['Quiz Torque and clearances. Not passed: 5 of 10 points, 50 %.']
		],
		[
			'a quiz was not sat',
			(draft) => (draft.quizzes = []),
			['Quiz not sat: Torque and clearances.']
		],
		[
			'a job sheet was sent back',
			(draft) =>
				(draft.tasks = draft.tasks.map((task) => ({ ...task, decision: 'not-yet' as const }))),
			[
				'Job sheet Measure a crankpin: not yet competent at attempt 2.',
				'Job sheet Argue a spun shell to its cause: not yet competent at attempt 1.'
			]
		],
		[
			'one waits for a marker and one was never handed in',
			(draft) => {
				draft.tasks = [];
				state(draft, 'sheet-1', 'waiting');
				state(draft, 'sheet-2', 'not-begun');
			},
			[
				'Job sheet not marked yet: Measure a crankpin.',
				'Job sheet not handed in: Argue a spun shell to its cause.',
				'Outcome not shown yet: Rule a crankpin for building or for running again, with the uncertainty stated.',
				'Outcome not shown yet: Argue damage on a bench back to its root cause and say what was ruled out.'
			]
		],
		[
			'a minute is missing',
			(draft) => (draft.bench.minutes = 719),
			['11 h 59 min at the bench recorded; the course asks for 12 h.']
		],
		[
			'nothing was shown at a bench',
			(draft) => (draft.steps = draft.steps.filter((step) => step.kind !== 'job-sheet')),
			[
				'The course has no job sheet, so nothing was shown at a bench.',
				'Outcome not shown yet: Rule a crankpin for building or for running again, with the uncertainty stated.',
				'Outcome not shown yet: Argue damage on a bench back to its root cause and say what was ruled out.'
			]
		],
		[
			'a needed case was not worked',
			(draft) => draft.steps.forEach((step) => (step.needed = true)),
			['Case not worked: The launch that stopped at 61 hours.']
		]
	])('is not met when %s', (_name, change, missing) => {
		const verdict = but(change);
		expect(verdict.missing).toEqual(missing);
		expect(verdict.met).toBe(false);
	});

	it('is met at the minute', () => {
		expect(but((draft) => (draft.bench.minutes = 720)).met).toBe(true);
	});
});

it('finds a rule by name and version, each once', () => {
	for (const rule of awardRules) expect(awardRule(ruleName(rule))).toBe(rule);
	expect(new Set(awardRules.map(ruleName)).size).toBe(awardRules.length);
	expect(() => awardRule('evidence-complete@99')).toThrow('no award rule');
});

describe('the face', () => {
	it('carries what was shown, how, and what was not', () => {
		expect(face.tasks.map((task) => [task.engine, howWords(task)])).toEqual([
			['AV3-1150, stand 4', 'alone'],
			['AV3-1150, stand 2', 'in a pair (took the readings of pins 1 and 3)']
		]);
		expect(face.notAssessed).toEqual(evidence.notAssessed);
		expect(face.because).toHaveLength(6);
		expect(certificateFaceSchema.parse(JSON.parse(JSON.stringify(face)))).toEqual(face);
	});

	it('cannot be made where the rule is not met, nor with a mistyped code', () => {
		const short = { ...evidence, bench: { minutes: 0, neededMinutes: 60 } };
		expect(() => faceOf(occasion, short, evidenceComplete)).toThrow('The rule is not met');
		const code = occasion.code.replace(/.$/, (last) => (last === '0' ? '2' : '0'));
		expect(() => faceOf({ ...occasion, code }, evidence, evidenceComplete)).toThrow();
	});
});

it('writes days and hours as people do', () => {
	expect([45, 60, 750].map(hoursWords)).toEqual(['45 min', '1 h', '12 h 30 min']);
	expect(dayWords('2026-03-04')).toBe('4 March 2026');
	expect(howWords({ how: 'helped', share: null })).toBe('with help');
});
