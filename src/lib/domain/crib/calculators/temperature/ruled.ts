import { alloysDifferBy } from '$lib/kernel/geometry/expansion';
import type { Body } from '$lib/kernel/geometry/temperature';
import { combinedStandard } from '$lib/kernel/measurement/combined';
import type { Component } from '$lib/kernel/measurement/component';
import { ruleReading } from '$lib/kernel/measurement/ruling';
import { temperatureComponents } from '$lib/kernel/measurement/sources-of-uncertainty';
import { coverageFactor, expandedMm } from '$lib/kernel/measurement/uncertainty';
import { computed, type Outcome } from '$lib/kernel/outcome';
import type { RuledReading } from '../../worked';

/** A reading with what was warm when it was taken, and how well that is known. */
export type Warm = { readMm: number; part: Body; instrument: Body; withinK: number };

/** What a size brought to 20 °C is uncertain by: the reading's own, the thermometers', the tables'. */
export function expandedAt20(
	warm: Warm,
	readingExpandedMm: number
): Outcome<{ expanded: number; parts: Component[] }> {
	const doubt = (body: Body) => ({
		...body,
		temperatureWithinC: warm.withinK,
		expansionWithinPerK: body.expansionPerK * alloysDifferBy
	});
	const parts = temperatureComponents(warm.readMm, doubt(warm.part), doubt(warm.instrument));
	if (!parts.ok) return parts;
	const all: Component[] = [
		{
			name: 'Reading',
			type: 'B',
			standard: readingExpandedMm / coverageFactor,
			sensitivity: 1,
			degreesOfFreedom: Infinity
		},
		...parts.value
	];
	const combined = combinedStandard(all);
	return combined.ok ? computed({ expanded: expandedMm(combined.value), parts: all }) : combined;
}

/** Rules the size at 20 °C where the reading's uncertainty and a printed limit are given. */
export function ruledAt20(
	at20: number,
	expanded: number,
	given: { least: number | undefined; most: number | undefined; uncertainty: number | undefined }
): Outcome<RuledReading[]> {
	const { least, most, uncertainty } = given;
	if (uncertainty === undefined || (least === undefined && most === undefined)) return computed([]);
	const limits = {
		...(least === undefined ? {} : { least }),
		...(most === undefined ? {} : { most })
	};
	const ruling = ruleReading({
		question: 'build',
		value: at20,
		expandedUncertainty: expanded,
		...limits
	});
	if (!ruling.ok) return ruling;
	return computed([
		{
			of: 'Size at 20 °C',
			question: 'build',
			value: at20,
			expandedUncertainty: expanded,
			unit: 'mm',
			decimals: 3,
			...limits,
			ruling: ruling.value
		}
	]);
}
