import type { DimensionName, UnitOf } from './units';

type Spelling<D extends DimensionName> = readonly [RegExp, UnitOf<D>];

/** What may stand between the two halves of a torque unit. */
const joint = '[·⋅.*\\s-]{0,2}';
const pound = '(lbf?s?|pounds?)';
const foot = '(ft|foot|feet)';
const inch = '(in|inch|inches)';
const either = (a: string, b: string) => new RegExp(`^(${a}${joint}${b}|${b}${joint}${a})$`, 'i');
const celsius = /^(°\s*c|deg\.?\s*c|c|celsius)$/i;
const fahrenheit = /^(°\s*f|deg\.?\s*f|f|fahrenheit)$/i;
const kelvin = /^(k|kelvins?)$/i;

/** How people write the units that we know, by dimension. */
export const spellings: { readonly [D in DimensionName]: readonly Spelling<D>[] } = {
	length: [
		[/^(mm|millimet(er|re)s?)$/i, 'mm'],
		[/^(cm|centimet(er|re)s?)$/i, 'cm'],
		[/^(m|met(er|re)s?)$/i, 'm'],
		[/^(µm|μm|um|microns?|micromet(er|re)s?)$/i, 'µm'],
		[/^(in\.?|inch|inches|"|″)$/i, 'in'],
		[/^(thou|thous|mil|mils)$/i, 'thou']
	],
	torque: [
		[new RegExp(`^(n|newton)${joint}(m|met(er|re)s?)$`, 'i'), 'N·m'],
		[either(pound, foot), 'lbf·ft'],
		[either(pound, inch), 'lbf·in'],
		[either('kgf?', 'cm'), 'kgf·cm'],
		[either('kgf?', 'm'), 'kgf·m']
	],
	force: [
		[/^(n|newtons?)$/i, 'N'],
		[/^kn$/i, 'kN'],
		[/^(lbf?s?|pounds?)$/i, 'lbf'],
		[/^kgf?$/i, 'kgf']
	],
	pressure: [
		[/^mpa$/i, 'MPa'],
		[/^kpa$/i, 'kPa'],
		[/^bars?$/i, 'bar'],
		[/^(psi|lbf?\/in(²|2))$/i, 'psi'],
		[/^kgf?\/cm(²|2)$/i, 'kgf/cm²'],
		[/^in\.?\s*hg$/i, 'inHg'],
		[/^(mm\s*hg|torr)$/i, 'mmHg']
	],
	volume: [
		[/^(cm(³|3)|cc|ccm|ml|cubic centimet(er|re)s?)$/i, 'cm³'],
		[/^mm(³|3)$/i, 'mm³'],
		[/^(l|lit(er|re)s?)$/i, 'L'],
		[/^m(³|3)$/i, 'm³'],
		[/^(in(³|3)|cu\.?\s*in\.?|cid|cubic inch(es)?)$/i, 'in³'],
		[/^(ft(³|3)|cu\.?\s*ft\.?|cubic feet)$/i, 'ft³'],
		[/^us\s*(qt|quarts?)$/i, 'US qt'],
		[/^us\s*(gal|gallons?)$/i, 'US gal']
	],
	angle: [
		[/^(°|deg|degrees?)$/i, '°'],
		[/^(rad|radians?)$/i, 'rad'],
		[/^(turns?|rev|revolutions?)$/i, 'turn']
	],
	temperature: [
		[celsius, '°C'],
		[fahrenheit, '°F'],
		[kelvin, 'K']
	],
	temperatureDifference: [
		[kelvin, 'K'],
		[celsius, '°C'],
		[fahrenheit, '°F']
	],
	power: [
		[/^kw$/i, 'kW'],
		[/^w(atts?)?$/i, 'W'],
		[/^(hp|bhp|horsepower)$/i, 'hp'],
		[/^(ps|metric (hp|horsepower))$/i, 'PS']
	],
	speed: [
		[/^m\/s(ec)?$/i, 'm/s'],
		[/^((ft|feet)\/min|fpm)$/i, 'ft/min'],
		[/^((ft|feet)\/s(ec)?|fps)$/i, 'ft/s']
	]
};
