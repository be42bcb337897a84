import type { Finding } from '$lib/domain/job-sheets/submission';

/** What the demo's students write. */
export function notesFor(key: string): string {
	if (key === 'as-received')
		return 'Oil at the mark, grey. Filter new, bracket rusty. Two sump bolts finger-tight at the pump end, the rest tight. Plug 2 wet.';
	return 'Grey sealant squeezed inwards at the last sump fitting, over older black sealant. One bright bolt among the sump bolts.';
}

export function findingFor(shot: string): Omit<Finding, 'id' | 'photographId'> {
	if (shot === 'pickup-screen')
		return {
			x: 0.5,
			y: 0.4,
			words: 'Soft grey strands lie over about two thirds of the screen.',
			because: 'sealant came loose inside the sump.',
			kind: 'failure'
		};
	if (shot === 'shells')
		return {
			x: 0.5,
			y: 0.29,
			words: 'Overlay wiped in the middle of the upper shell, no scratches in it.',
			because: 'the film failed; the neighbours show the same, lighter.',
			kind: 'failure'
		};
	return {
		x: 0.52,
		y: 0.42,
		words: 'Blue band in the middle of the pin, no scoring.',
		because: 'it ran without a film.',
		kind: 'failure'
	};
}

export function argumentFor(jobSheetKey: string) {
	if (jobSheetKey === 'strip-and-tag')
		return {
			rootCause: 'Likeliest: too much sealant at the sump joint',
			chain:
				'1: strands over the screen, because sealant was squeezed inwards at the last fitting. I would look at the shells next: they should all be wiped alike.',
			ruledOut: 'Low oil: the wall of the sump is wet to the mark.',
			notLookedAt: 'Relief valve, pump clearance.'
		};
	return {
		rootCause: 'Excess sealant at the last sump fitting',
		chain:
			'1, wiped without scratches, because the film failed; because the pump drew too little; because strands of sealant closed the pickup screen, photograph 3; because the bead at the joint was as thick as a pencil.',
		ruledOut:
			'Dirty oil: no scoring on any shell. One bad fit: pins 1 and 3 show the same, lighter.',
		notLookedAt: 'Relief valve.'
	};
}
