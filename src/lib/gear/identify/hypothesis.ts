/** One gear that could have made the readings, and what it would show in one of them. */
import type { Kind } from './candidates';
import type { OutsideDiameterReading } from './contract';

/** A gear of a kind with a tooth count, seen at a helix angle. */
export interface Hypothesis {
	kind: Kind;
	teeth: number;
	/** Radians. */
	helixAngle: number;
	mateTeeth: number | null;
	/** In modules: of the two that full depth is met with. */
	dedendum: number;
	taken: NonNullable<OutsideDiameterReading['taken']> | 'tip-to-bottom';
	/** In modules: by how much the tips stand further out than nominal, as far as the outside diameter tells. */
	rise: number;
}

/** Value at nominal, and what a module of shift, tip loss and thickness loss and a radian of helix would add, mm. */
export interface Prediction {
	nominal: number;
	shift: number;
	tip: number;
	thickness: number;
	helix: number;
	/** Natural logarithm of how often such a reading is taken at all; 0 for what is usual. */
	logChance: number;
	/** How far gears of this kind differ from each other in this reading, mm. */
	own: number;
}
