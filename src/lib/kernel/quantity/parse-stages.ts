import { cannot, computed, type Outcome } from '../outcome';
import { parseQuantity } from './parse-quantity';
import { convert, type UnitOf } from './units';

/** One stage of a tightening: to a torque, or on by an angle. */
export type TypedStage = { torqueNm: number } | { angleDeg: number };

/** More stages than any printed plan has. */
const most = 12;

/**
 * A tightening plan as manuals print it: "35 Nm + 90°", "20 Nm, 40 Nm, 90°", "30 lbf·ft then 1/4 turn".
 *
 * @param typed stages between +, comma with space, semicolon, "then" or new lines
 * @param fallback unit of a bare figure; without one, a figure must say whether it is torque or angle
 * @returns the stages in order, in N·m and degrees; "cannot" names the stage that cannot be read
 * @example parseStages('35 Nm + 90°') // [{ torqueNm: 35 }, { angleDeg: 90 }]
 */
export function parseStages(typed: string, fallback?: UnitOf<'torque'>): Outcome<TypedStage[]> {
	const written = typed
		.split(/\s*(?:\+|;|\n|,\s|\bthen\b)\s*/i)
		.map((one) => one.trim())
		.filter(Boolean);
	if (written.length === 0) return cannot('there is no stage in it');
	if (written.length > most) return cannot(`no plan has more than ${most} stages`);
	const stages: TypedStage[] = [];
	for (const [at, text] of written.entries()) {
		const stage = oneStage(text, fallback);
		if (!stage.ok) return cannot(`stage ${at + 1}, “${text}”: ${stage.because}`);
		stages.push(stage.value);
	}
	return computed(stages);
}

function oneStage(text: string, fallback?: UnitOf<'torque'>): Outcome<TypedStage> {
	const angle = parseQuantity(text, 'angle');
	if (angle.ok) {
		const degrees = convert('angle', angle.value.value, angle.value.unit as '°', '°');
		return degrees > 0 ? computed({ angleDeg: degrees }) : cannot('an angle is above zero');
	}
	const torque = parseQuantity(text, 'torque', fallback);
	if (!torque.ok)
		return /\d\s*$/.test(text) ? cannot('say N·m, lbf·ft or degrees as well') : torque;
	const newtonMetres = convert('torque', torque.value.value, torque.value.unit as 'N·m', 'N·m');
	return newtonMetres > 0 ? computed({ torqueNm: newtonMetres }) : cannot('a torque is above zero');
}
