/**
 * How the demonstration is written down: short entries from which plants, gears and a year of checks are made.
 * All of it is invented; the figures only have to be such as a plant could have.
 */
import type { Finish } from '$lib/gear/contract';
import type { MaterialStatement } from '$lib/records/material';
import type { ChosenPitch, KnownDrive } from '$lib/records/mirror';
import type { PlantRules } from '$lib/records/plant-rules';
import type { Role } from '$lib/records/protocol';

export interface DemoPerson {
	email: string;
	name: string;
	locale: 'en' | 'es';
	/** Printed by the start command: it opens nothing but the demonstration. */
	password: string;
}

export interface DemoMaterial {
	key: string;
	statement: Omit<MaterialStatement, 'source' | 'edition' | 'validFrom'>;
	/** Later revisions: how many days ago, and what they changed. */
	revisions?: [daysAgo: number, change: Partial<MaterialStatement>][];
}

export interface DemoCheck {
	daysAgo: number;
	material: string;
	/** Which of the plant's tablets, 0 or 1. */
	tablet: 0 | 1;
	/** What was different that day: the spare's face width, the load, or something that was not to be had. */
	face?: number;
	power?: number;
	unknown?: 'load' | 'face' | 'speed';
	finish?: Finish;
}

export interface DemoPosition {
	name: string;
	mateTeeth: number | null;
	/** Null: nobody has measured it yet. */
	gear: {
		teeth: number;
		pitch: ChosenPitch;
		angle: 14.5 | 20;
		form: 'full-depth' | 'stub';
		/** In the plant's unit: in or mm. */
		face: number;
		finish: Finish;
		material: string;
	} | null;
	/** Power in the plant's unit: hp or kW. */
	drive: { power: number | null; rpm: number; duty: KnownDrive['duty']; reversing?: true } | null;
	checks: DemoCheck[];
}

export interface DemoMachine {
	tag: string;
	name: string;
	area: string;
	positions: DemoPosition[];
}

export interface DemoPlant {
	name: string;
	origin: 'inch' | 'metric';
	people: { person: DemoPerson; role: Role }[];
	/** Who recorded the checks of each tablet, by address. */
	authors: [string, string];
	rules: PlantRules;
	materials: DemoMaterial[];
	machines: DemoMachine[];
	/** Numbers that the second tablet drew and that never came, and how many it still holds. */
	lost: { after: number; count: number };
	waiting: number;
}

export const DEMO_NOTE = 'Figures are invented demo data.';
const DEMO_RULE = 'demo rule, after general practice';

export const DEMO_SERVICE_FACTORS: PlantRules['serviceFactors'] = [
	{ duty: 'uniform', factor: 1, source: DEMO_RULE },
	{ duty: 'light-shock', factor: 1.25, source: DEMO_RULE },
	{ duty: 'medium-shock', factor: 1.5, source: DEMO_RULE },
	{ duty: 'heavy-shock', factor: 2, source: DEMO_RULE }
];

export const dp = (value: number): ChosenPitch => ({ system: 'diametral', value });
export const module = (value: number): ChosenPitch => ({ system: 'module', value });

/** One check in the order: days ago, material, tablet, what was different. */
export function check(
	daysAgo: number,
	material: string,
	tablet: 0 | 1,
	different: Omit<DemoCheck, 'daysAgo' | 'material' | 'tablet'> = {}
): DemoCheck {
	return { daysAgo, material, tablet, ...different };
}
