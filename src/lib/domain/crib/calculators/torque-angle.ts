import { preloadN } from '$lib/kernel/fasteners/preload';
import { turnedDeg } from '$lib/kernel/fasteners/stage-sequence';
import { inSeriesNPerMm } from '$lib/kernel/fasteners/stiffness';
import { angleForPreloadDeg, tightenByAngle } from '$lib/kernel/fasteners/torque-angle';
import { travelMm } from '$lib/kernel/fasteners/turn';
import { lastingStrain } from '$lib/kernel/fasteners/yield-load';
import { cannot, computed, type Outcome } from '$lib/kernel/outcome';
import { calculator } from '../calculator';
import { list, number, quantity } from '../field';
import { boltOf } from './fasteners/bolt';
import {
	boltFields,
	coefficient,
	factorFields,
	factorSource,
	length,
	snugTorque,
	wantedLoad
} from './fasteners/bolt-fields';
import { anglesDeg, boltPresets, factorValues, lastTorqueNm } from './fasteners/bolt-presets';
import { angleLines, angleNotes } from './fasteners/angle-lines';
import { angleSteps, type Turned } from './fasteners/angle-steps';
import { clampedFields, clampedOf } from './fasteners/clamped';
import { stretchedOf } from './fasteners/stretched';

/** Load of a bolt by a snug torque and angles, to yield and past it. */
export const torqueAngle = calculator({
	key: 'torque-angle',
	title: 'Torque plus angle',
	says: 'How hard a bolt pulls after a snug torque and its angles, where it begins to yield, and how far it is drawn beyond.',
	drawer: 'fasteners',
	caution:
		'A bolt that has been turned past yield is fitted once: it is thrown away, however good it looks. Mark head and part before you turn, and count the angle once only.',
	formulas: [
		'fasteners/preload',
		'fasteners/bolt-loads',
		'fasteners/bolt-stiffness',
		'fasteners/times-as-stiff',
		'fasteners/joint-of-cones',
		'fasteners/in-series',
		'fasteners/yield-load',
		'fasteners/strength-while-turned',
		'fasteners/travel',
		'fasteners/torque-angle',
		'fasteners/angle-for-preload',
		'fasteners/lasting-strain'
	],
	sources: [
		'The model is two straight lines, level past yield unless a hardening is given: it shows how far a bolt is drawn rather than exactly how hard it pulls. Young’s moduli: common handbook values, steel 205 GPa, cast iron 100, aluminium 70.',
		factorSource
	],
	fields: {
		...boltFields,
		grip: quantity({
			...length,
			words: 'Stretched length',
			hint: 'From under the head to the first thread that carries.',
			decimals: 1,
			least: 3,
			most: 2000,
			example: '95'
		}),
		shankLength: quantity({
			...length,
			words: 'Of it plain shank',
			hint: 'Left out, all of it counts as thread.',
			decimals: 1,
			least: 0.1,
			most: 2000,
			optional: true,
			example: ''
		}),
		shankDiameter: quantity({
			...length,
			words: 'Diameter of the shank',
			hint: 'Where it is thinner than the thread, it yields there.',
			decimals: 2,
			least: 0.5,
			most: 200,
			optional: true,
			example: ''
		}),
		...clampedFields,
		snug: snugTorque,
		...factorFields,
		angle: list({
			dimension: 'angle',
			unit: { metric: '°', inch: '°' },
			words: 'Angles after it, stage by stage',
			hint: 'With spaces or semicolons between.',
			example: '90; 90'
		}),
		threadFriction: number({
			...coefficient,
			words: 'Friction in the thread',
			hint: 'With it the twist of tightening is counted: the bolt yields sooner. Oiled steel about 0.12.',
			optional: true,
			example: ''
		}),
		hardening: number({
			words: 'Rise past yield, % of the rise before',
			hint: 'Left out, the load stays level past yield.',
			least: 0,
			most: 50,
			optional: true,
			example: ''
		}),
		wanted: wantedLoad
	},
	work(values) {
		const { snug, leastFactor, mostFactor, angle, hardening, wanted, grip } = values;
		if (mostFactor < leastFactor) return cannot('the least nut factor lies above the most');
		if (angle.some((one) => !(one >= 0) || one > 720))
			return cannot('each angle lies between 0° and 720°');
		const bolt = boltOf(values);
		if (!bolt.ok) return bolt;
		const stretched = stretchedOf(bolt.value, values);
		if (!stretched.ok) return stretched;
		const { diameterMm, pitchMm } = bolt.value.geometry;
		const { stiffnessNPerMm, weakest, yieldN, loads } = stretched.value;
		const parts = clampedOf(values, stiffnessNPerMm, diameterMm, grip);
		if (!parts.ok) return parts;
		const both = inSeriesNPerMm(stiffnessNPerMm, parts.value.stiffnessNPerMm);
		if (!both.ok) return both;
		const joint = {
			pitchMm,
			boltNPerMm: stiffnessNPerMm,
			jointNPerMm: parts.value.stiffnessNPerMm,
			yieldN
		};
		const whole = turnedDeg(angle.map((angleDeg) => ({ angleDeg })));
		const turn = (factor: number): Outcome<Turned> => {
			const first = preloadN(snug, factor, diameterMm);
			if (!first.ok) return first;
			const asked = { ...joint, snugN: first.value, hardening: (hardening ?? 0) / 100 };
			const made = tightenByAngle({ ...asked, angleDeg: whole, tensileN: loads.tensileN });
			if (!made.ok) return made;
			const strain = lastingStrain(made.value.lastingMm, weakest.lengthMm);
			if (!strain.ok) return strain;
			const needed =
				wanted === undefined
					? computed(undefined)
					: angleForPreloadDeg(wanted * 1000, { ...joint, snugN: first.value });
			if (!needed.ok) return needed;
			return computed({
				factor,
				snugN: first.value,
				strain: strain.value,
				neededDeg: needed.value,
				...made.value
			});
		};
		const slippery = turn(leastFactor);
		if (!slippery.ok) return slippery;
		const dragging = turn(mostFactor);
		if (!dragging.ok) return dragging;
		const ends = leastFactor === mostFactor ? [slippery.value] : [slippery.value, dragging.value];
		return computed({
			lines: angleLines(ends, yieldN),
			working: [
				...bolt.value.areaSteps,
				...stretched.value.steps,
				parts.value.step,
				...angleSteps(ends, {
					...joint,
					bothNPerMm: both.value,
					diameterMm,
					snugNm: snug,
					angles: angle,
					travelMm: travelMm(whole, pitchMm),
					hardening,
					drawnMm: weakest.lengthMm,
					wantedKn: wanted
				})
			],
			notes: angleNotes(ends, loads.proofN),
			drawing: {
				kind: 'torque-angle',
				lines: ends.map((one) => one.points),
				stagesDeg: angle.map((_, at) =>
					turnedDeg(angle.slice(0, at + 1).map((angleDeg) => ({ angleDeg })))
				),
				yieldN,
				proofN: loads.proofN,
				angleAtYieldDeg: slippery.value.angleAtYieldDeg
			}
		});
	},
	presets: (sheet) =>
		boltPresets(sheet, (bolt) => {
			const last = lastTorqueNm(bolt);
			const angles = anglesDeg(bolt);
			if (last === undefined || angles.length === 0) return undefined;
			return {
				...(bolt.gripMm ? { grip: String(bolt.gripMm) } : {}),
				shankLength: '',
				shankDiameter: '',
				snug: String(last),
				...factorValues(bolt),
				angle: angles.join('; '),
				wanted: ''
			};
		})
});
