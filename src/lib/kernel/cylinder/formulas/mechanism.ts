import type { Formula } from '../../formula';
import { computed, type Outcome } from '../../outcome';
import { compressionHeight, pistonDeck, pistonToHeadMm, rodLength } from '../block-stack';
import { crankAngleAtDeg, pistonBelowTdcMm } from '../liquid-lock';
import { bucklingOf, roundSlenderness } from '../rod-buckling';
import {
	meanPistonSpeedMPerS,
	pistonForceN,
	powerKw,
	pressureForForceMPa
} from '../speed-and-power';

const part = <T>(found: Outcome<T>, of: (value: T) => number): Outcome<number> =>
	found.ok ? computed(of(found.value)) : found;
const stack = { blockHeight: 9.025, deck: 0.025, stroke: 3.5 };

export const mechanismFormulas: readonly Formula[] = [
	{
		id: 'cylinder/piston-position',
		works: pistonBelowTdcMm,
		formula: 'x = r + L − r · cos φ − √(L² − r² · sin² φ), r = S/2',
		source: 'geometry of the crank, any textbook of engine mechanics',
		example: {
			says: 'stroke 86, rod 143 mm, 90° after top dead centre, mm',
			gives: () => pistonBelowTdcMm(86, 143, 90),
			wanted: 49.62,
			within: 0.02
		}
	},
	{
		id: 'cylinder/crank-angle',
		works: crankAngleAtDeg,
		formula: 'cos φ = (r² + (r + L − x)² − L²) / (2 · r · (r + L − x)), r = S/2',
		source: 'cosine rule on crank, rod and centre line',
		example: {
			says: 'the same crank, 49.62 mm down, degrees',
			gives: () => crankAngleAtDeg(86, 143, 49.62),
			wanted: 90,
			within: 0.05
		}
	},
	{
		id: 'cylinder/mean-piston-speed',
		works: meanPistonSpeedMPerS,
		formula: 'v = 2 · S · n / 60',
		source: 'definition',
		example: {
			says: 'stroke 89.1 mm at 5200 r/min, m/s',
			gives: () => meanPistonSpeedMPerS(89.1, 5200),
			wanted: 15.44,
			within: 0.01
		}
	},
	{
		id: 'cylinder/power',
		works: powerKw,
		formula: 'P = 2π · M · n / 60',
		source: 'definition',
		example: {
			says: '250 N·m at 4000 r/min, kW',
			gives: () => powerKw(250, 4000),
			wanted: 104.72,
			within: 0.005
		}
	},
	{
		id: 'cylinder/piston-force',
		works: pistonForceN,
		formula: 'F = p · π/4 · B²',
		source: 'definition',
		example: {
			says: '0.5516 MPa (80 psi) on 86.36 mm, N',
			gives: () => pistonForceN(0.5516, 86.36),
			wanted: 3231,
			within: 1
		}
	},
	{
		id: 'cylinder/pressure-for-force',
		works: pressureForForceMPa,
		formula: 'p = F / (π/4 · B²)',
		source: 'definition',
		example: {
			says: '136.1 kN on 86 mm, MPa',
			gives: () => pressureForForceMPa(136_100, 86),
			wanted: 23.4,
			within: 0.05
		}
	},
	{
		id: 'cylinder/buckling',
		works: bucklingOf,
		formula: 'λt = √(2π²E/Re); F = A · Re · (1 − Re · λ² / (4π²E)) below it, π²EA/λ² above',
		source: "Johnson's parabola and Euler's column, machine-design textbooks",
		example: {
			says: '250 mm², slenderness 12.08, yield 550 N/mm², N',
			gives: () =>
				part(
					bucklingOf({ areaMm2: 250, slenderness: 12.08, yieldMPa: 550, modulusMPa: 206_000 }),
					(one) => one.loadN
				),
			wanted: 136_100,
			within: 100
		}
	},
	{
		id: 'cylinder/round-slenderness',
		works: roundSlenderness,
		formula: 'λ = L / (d/4)',
		source: 'radius of gyration of a circle',
		example: {
			says: '250 mm long, 8 mm thick',
			gives: () => roundSlenderness(250, 8),
			wanted: 125,
			within: 0.01
		}
	},
	{
		id: 'cylinder/rod-length',
		works: rodLength,
		formula: 'L = H − deck − hk − S/2',
		source: 'geometry of the block',
		example: {
			says: 'block 9.025, deck 0.025, compression height 1.0, stroke 3.5 in',
			gives: () => rodLength(stack, 1),
			wanted: 6.25,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/compression-height',
		works: compressionHeight,
		formula: 'hk = H − deck − L − S/2',
		source: 'geometry of the block',
		example: {
			says: 'the same block with a rod of 6.0 in',
			gives: () => compressionHeight(stack, 6),
			wanted: 1.25,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/piston-deck',
		works: pistonDeck,
		formula: 'deck = H − hk − L − S/2',
		source: 'geometry of the block',
		example: {
			says: 'block 9.025, compression height 1.25, rod 6.0, stroke 3.5 in',
			gives: () => pistonDeck({ blockHeight: 9.025, compressionHeight: 1.25, rod: 6, stroke: 3.5 }),
			wanted: 0.025,
			within: 1e-9
		}
	},
	{
		id: 'cylinder/piston-to-head',
		works: pistonToHeadMm,
		formula: 's = gasket + deck',
		source: 'geometry of the block',
		example: {
			says: 'gasket 1.2 mm, piston 0.45 mm proud, mm',
			gives: () => pistonToHeadMm(1.2, -0.45),
			wanted: 0.75,
			within: 1e-9
		}
	}
];
