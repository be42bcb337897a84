import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { catalogue } from '$lib/content/catalogue';
import { figuresOf } from '$lib/domain/data-sheets/figures';
import { kindOf } from '$lib/domain/questions/registry';
import type { OrderResponse } from '$lib/domain/questions/kinds/tightening-order';

const questions = catalogue().courses.flatMap(({ questions: own, sheet }) =>
	own.map((question) => [question.key, question, figuresOf(sheet)] as const)
);
const seed = fc.string({ minLength: 1, maxLength: 24 });

function drawn(
	question: (typeof questions)[number][1],
	figures: (typeof questions)[number][2],
	from: string
) {
	const made = kindOf(question.kind).draw(question.body, from, figures);
	if (!made.ok) throw new Error(`${question.key}: ${made.because}`);
	return made.value;
}

/** The response that the question's own answer describes. */
function rightResponse(question: (typeof questions)[number][1], held: unknown): unknown {
	const kind = kindOf(question.kind);
	const answer = kind.answer(question.body, held);
	switch (question.kind) {
		case 'single-choice':
			return { choice: answer.optionIds?.[0] };
		case 'several-choices':
			return { choices: answer.optionIds };
		case 'ruling':
			return { ruling: answer.optionIds?.[0] };
		case 'tightening-order':
			return { order: answer.order } satisfies Partial<OrderResponse>;
		case 'number-with-unit': {
			const [, value = '', unit = ''] =
				/^(\S+?)(?:\s+(.*))?$/.exec(answer.words.replace('°', ' °')) ?? [];
			return { value, unit };
		}
	}
}

describe.each(questions)('%s', (_, question, figures) => {
	const kind = kindOf(question.kind);

	it('gives full points for its own answer, whatever the seed', () => {
		fc.assert(
			fc.property(seed, (from) => {
				const held = drawn(question, figures, from);
				const response = kind.responseSchema.parse(rightResponse(question, held));
				expect(kind.score(question.body, held, response)).toMatchObject({ points: 1, right: true });
				expect(kind.emptyIsOmitted(response)).toBe(false);
				expect(kind.working(question.body, held).length).toBeGreaterThan(0);
			}),
			{ numRuns: 40 }
		);
	});

	it('shows a face from which neither key nor seed can be had', () => {
		fc.assert(
			fc.property(fc.uuid(), (from) => {
				const held = drawn(question, figures, from);
				const face = JSON.stringify(kind.face(question.body, held));
				expect(face).not.toContain(from);
				expect(face).not.toMatch(/"(right|key|seed|expected|answer|order|because|ruling)"\s*:/);
				if (question.kind === 'tightening-order') {
					const order = kind.answer(question.body, held).order ?? [];
					const shown = (kind.face(question.body, held) as { bolts: { id: string }[] }).bolts;
					expect(shown.map((one) => one.id)).not.toEqual(order);
				}
				if (question.kind === 'number-with-unit') {
					const { words } = kind.answer(question.body, held);
					const { given } = kind.face(question.body, held) as {
						given: { value: number; unit: string }[];
					};
					// 60 N·m beside an angle of 60° gives nothing away: only the whole quantity would.
					const shown = given.map((one) => `${one.value} ${one.unit}`);
					const [figure, ...unit] = words.split(' ');
					expect(shown).not.toContain([Number(figure), ...unit].join(' '));
				}
			}),
			{ numRuns: 40 }
		);
	});

	it('is drawn the same again from the same seed', () => {
		expect(drawn(question, figures, 'same')).toEqual(drawn(question, figures, 'same'));
	});
});

describe('a number', () => {
	const [, question, figures] =
		questions.find(([key]) => key === 'wrench-with-straight-extension') ?? [];

	it('is right in another unit, and a right figure in a wrong unit is told so', () => {
		if (!question || !figures) throw new Error('the question is gone');
		const kind = kindOf('number-with-unit');
		const held = drawn(question, figures, 'units') as { expected: { value: number } };
		const newtonMetres = held.expected.value;
		// 1 lbf·ft = 1.3558179483314 N·m exactly, NIST SP 811.
		const poundFeet = (newtonMetres / 1.3558179483314).toFixed(2);
		const score = (value: string, unit: string) => kind.score(question.body, held, { value, unit });
		expect(score(poundFeet, 'lbf·ft')).toMatchObject({ right: true });
		expect(score(newtonMetres.toFixed(1).replace('.', ','), 'N·m')).toMatchObject({ right: true });
		expect(score(newtonMetres.toFixed(1), 'lbf·ft').explain).toContain('right in N·m');
		expect(score('forty', 'N·m').explain).toContain('cannot be read');
	});
});

describe('a tightening order', () => {
	const [, question, figures] = questions.find(([key]) => key === 'head-bolt-order') ?? [];

	it('names the first wrong step, and its mirror image is wrong at the first', () => {
		if (!question || !figures) throw new Error('the question is gone');
		const kind = kindOf('tightening-order');
		const held = drawn(question, figures, 'order') as { order: string[] };
		const mirrored = held.order.map((id) =>
			id.startsWith('A') ? `B${id.slice(1)}` : `A${id.slice(1)}`
		);
		expect(kind.score(question.body, held, { order: mirrored })).toMatchObject({
			points: 0,
			right: false
		});
		const [first = '', second = '', ...rest] = held.order;
		const swapped = [first, rest[0] ?? '', second, ...rest.slice(1)];
		expect(kind.score(question.body, held, { order: swapped }).explain).toContain(
			'first wrong step is 2'
		);
	});
});
