import { nextSize } from '$lib/kernel/geometry/next-size';
import type { Step } from '../../../working';
import type { ResultLine } from '../../worked';
import { figure } from '../formula-figures';
import { mm } from './faces';
import type { Part } from './grid-shape';

type Asked = {
	worstMm: number;
	nominalMm: number | undefined;
	stepsMm: readonly number[] | undefined;
	stockMm: number | undefined;
};

/** The next size that the part cleans up to, where standard size and steps are given. */
export function nextSizeShown(
	part: Part,
	{ worstMm, nominalMm, stepsMm, stockMm = 0 }: Asked
): { lines: ResultLine[]; working: Step[] } {
	if (nominalMm === undefined || stepsMm === undefined) return { lines: [], working: [] };
	const [over, sign, worst] =
		part === 'bore' ? ['oversize', '+', 'largest'] : ['undersize', '−', 'smallest'];
	const words = `Next ${over}`;
	const found = nextSize(part, worstMm, nominalMm, stepsMm, stockMm);
	if (!found.ok)
		return { lines: [{ key: 'next', words, text: found.because, main: true }], working: [] };
	const { stepMm, sizeMm, leftMm } = found.value;
	return {
		lines: [
			{ key: 'next', words, value: stepMm, ...mm, main: true },
			{ key: 'next-size', words: 'Size to machine to', value: sizeMm, ...mm },
			{ key: 'left', words: 'Taken off at the worst place, in diameter', value: leftMm, ...mm }
		],
		working: [
			{
				words: `${words}: the smallest listed one that leaves at least ${figure(stockMm)} mm to take off where the ${worst} reading is`,
				rule: `standard ${sign} step`,
				formula: `${figure(nominalMm)} ${sign} ${figure(stepMm)}`,
				value: sizeMm,
				...mm
			},
			{
				words: 'What is taken off there',
				rule: part === 'bore' ? 'size − largest' : 'smallest − size',
				formula:
					part === 'bore'
						? `${figure(sizeMm)} − ${figure(worstMm)}`
						: `${figure(worstMm)} − ${figure(sizeMm)}`,
				value: leftMm,
				...mm
			}
		]
	};
}
