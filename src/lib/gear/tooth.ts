/**
 * A tooth as its rack generates it: one description that strength, measuring, mesh and drawing share. Module 1; the
 * tooth's centre line is the y axis, the gear's centre the origin. External teeth, from 8 upwards.
 */
import type { Reason } from './contract';
import { filletPoint, tipCentre, type Point } from './fillet';
import { involute } from './involute';
import { largestTipRadius, straightDepth, type BasicRack } from './rack';
import { nominalThickness } from './thickness';

export interface ToothShape {
	/** Need not be whole: a helical gear's virtual teeth are not. */
	teeth: number;
	rack: BasicRack;
	/** In modules, as is the radial wear of the tip. */
	profileShift: number;
	tipWear: number;
}

/** Where the fillet ends and the involute begins; there the fillet's angle is `formAngle`. */
export interface FlankStart {
	formRadius: number;
	formAngle: number;
	undercut: boolean;
}

export interface Tooth extends ToothShape, FlankStart {
	pitchRadius: number;
	baseRadius: number;
	rootRadius: number;
	/** After wear. */
	tipRadius: number;
}

/** Fewest teeth that are drawn; the Lewis method itself starts at ten. */
const FEWEST = 8;
/** Degrees; the tolerance only forgives the arithmetic of an angle that came from another plane. */
const LEAST_ANGLE = 14.5;
const MOST_ANGLE = 25;
const SAME_ANGLE = 1e-6;
const ROUNDING = 1e-9;

/** The tooth of a shape, or the reason why that rack cuts none. Range: 8 teeth and more, 14.5 to 25 degrees. */
export function generateTooth(shape: ToothShape): Tooth | Reason {
	const { teeth, rack, profileShift, tipWear } = shape;
	const refused = rackRefusal(rack) ?? fewRefusal(teeth);
	if (refused) return refused;
	const start = flankStart(shape);
	if ('code' in start) return start;

	const pitchRadius = teeth / 2;
	const baseRadius = pitchRadius * Math.cos(rack.pressureAngle);
	const rootRadius = pitchRadius - rack.dedendum + profileShift;
	const tipRadius = pitchRadius + rack.addendum + profileShift - tipWear;
	if (tipRadius <= start.formRadius) return TIP_WORN_AWAY;

	const tooth = { ...shape, pitchRadius, baseRadius, rootRadius, tipRadius, ...start };
	return halfThicknessAngle(tooth, tipRadius) > 0 ? tooth : TOOTH_POINTED;
}

/**
 * Where the rack lets the involute begin, or why it leaves none below the pitch circle. Rolling geometry, so it holds
 * for every count and angle, and in the transverse plane too; the Lewis method has narrower limits.
 */
export function flankStart({ teeth, rack, profileShift }: Omit<ToothShape, 'tipWear'>): FlankStart | Reason {
	if (tipCentre(rack).depth - profileShift < 0) return SHIFT_TOO_LARGE;
	if (!(teeth / 2 - rack.dedendum + profileShift > 0)) return UNDERCUT_TOO_DEEP;
	const undercut = isUndercutBy(rack, teeth, profileShift);
	const formAngle = undercut ? undercutAngle(teeth, rack, profileShift) : rack.pressureAngle;
	if (formAngle === null) return UNDERCUT_TOO_DEEP;
	const end = filletPoint(rack, teeth, profileShift, formAngle);
	const formRadius = Math.hypot(end.x, end.y);
	return formRadius < teeth / 2 ? { formRadius, formAngle, undercut } : UNDERCUT_TOO_DEEP;
}

/**
 * Whether the rack cuts into the involute at the root, all in modules of one plane: hs - x > r sin² α, hs its straight
 * depth. Source: Bevan, The Theory of Machines, Ex. 10.4, p. 334.
 */
export function isUndercutBy(rack: BasicRack, teeth: number, profileShift: number): boolean {
	const deepest = (teeth / 2) * Math.sin(rack.pressureAngle) ** 2;
	return straightDepth(rack) - profileShift > deepest * (1 + ROUNDING);
}

/**
 * Half the tooth's thickness at a radius, as an angle at the gear's centre in radians; radius from the base circle.
 * θ = (π / 2 + 2 x tan α) / N + inv α - inv αR, cos αR = rb / R. Source: involute geometry (definition).
 */
export function halfThicknessAngle(
	tooth: Pick<Tooth, 'teeth' | 'rack' | 'profileShift' | 'baseRadius'>,
	radius: number
): number {
	const { teeth, profileShift, rack, baseRadius } = tooth;
	const atPitch = nominalThickness(1, profileShift, rack.pressureAngle) / teeth;
	return atPitch + involute(rack.pressureAngle) - involute(pressureAngleAt(baseRadius, radius));
}

/** Pressure angle in radians of the involute at a radius; 0 at the base circle. */
export function pressureAngleAt(baseRadius: number, radius: number): number {
	return Math.acos(Math.min(1, baseRadius / radius));
}

/**
 * Outline of one tooth from the middle of the space on its left to that on its right, `steps` points for each curve.
 * For drawings to scale; multiply by the module.
 */
export function toothOutline(tooth: Tooth, steps: number): Point[] {
	const { rack, teeth, profileShift, formAngle, formRadius, tipRadius, rootRadius } = tooth;
	const share = (from: number, to: number) =>
		Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps);
	const onCircle = (radius: number, angle: number): Point => ({
		x: radius * Math.sin(angle),
		y: radius * Math.cos(angle)
	});
	const flank = share(tipRadius, formRadius).map((radius) =>
		onCircle(radius, halfThicknessAngle(tooth, radius))
	);
	const fillet = share(formAngle, Math.PI / 2).map((psi) => filletPoint(rack, teeth, profileShift, psi));
	const root = share(tipCentre(rack).x / (teeth / 2), Math.PI / teeth).map((angle) =>
		onCircle(rootRadius, angle)
	);
	const tip = share(0, halfThicknessAngle(tooth, tipRadius)).map((angle) => onCircle(tipRadius, angle));
	const right = [...tip, ...flank.slice(1), ...fillet.slice(1), ...root.slice(1)].map(({ x, y }) => ({
		x,
		y
	}));
	const left = right.slice(1).map(({ x, y }) => ({ x: -x, y }));
	return [...left.reverse(), ...right];
}

/**
 * Where an undercutting fillet crosses the involute: the fillet starts in the tooth space, beyond the flank, and dives
 * into the tooth before it reaches the base circle. Null where no involute is left to cross.
 */
function undercutAngle(teeth: number, rack: BasicRack, profileShift: number): number | null {
	const baseRadius = (teeth / 2) * Math.cos(rack.pressureAngle);
	const shape = { teeth, rack, profileShift, baseRadius };
	const beyondFlank = (psi: number) => {
		const { x, y } = filletPoint(rack, teeth, profileShift, psi);
		const radius = Math.hypot(x, y);
		if (radius < baseRadius) return -1;
		return Math.atan2(x, y) - halfThicknessAngle(shape, radius);
	};
	// The fillet's angle runs over less than a right angle; the crossing is where it first comes to lie in the tooth.
	const steps = 64;
	const at = (i: number) => rack.pressureAngle + ((Math.PI / 2 - rack.pressureAngle) * i) / steps;
	// The fillet's start itself is never in the tooth, though a slight undercut leaves it so near to the flank that
	// rounding might say so: it is not asked.
	const first = Array.from({ length: steps }, (_, i) => i + 1).find((i) => beyondFlank(at(i)) < 0);
	if (first === undefined) return null;
	let [outside, inside] = [at(first - 1), at(first)];
	for (let halving = 0; halving < 50; halving++) {
		const middle = (outside + inside) / 2;
		if (beyondFlank(middle) < 0) inside = middle;
		else outside = middle;
	}
	return outside;
}

/** Why a rack cuts no tooth that the method knows. */
export function rackRefusal(rack: BasicRack): Reason | null {
	const degrees = (rack.pressureAngle * 180) / Math.PI;
	if (!(degrees >= LEAST_ANGLE - SAME_ANGLE && degrees <= MOST_ANGLE + SAME_ANGLE)) {
		const pressureAngle = Number(degrees.toFixed(3));
		return {
			code: 'angle-not-covered',
			text: `The form factor by geometry reaches from 14.5 to 25 degrees, this tooth has ${pressureAngle} in its normal plane. Check the pressure angle, or have the gear rated by an engineer.`,
			values: { pressureAngle }
		};
	}
	return rack.tipRadius > largestTipRadius(rack) + ROUNDING ? NO_ROOM_AT_TIP : null;
}

function fewRefusal(teeth: number): Reason | null {
	if (teeth >= FEWEST) return null;
	return {
		code: 'too-few-teeth',
		text: `A tooth shape is worked out from ${FEWEST} teeth, this gear has ${teeth}. Count again, or have the gear rated by an engineer.`,
		values: { teeth, fewest: FEWEST }
	};
}

const NO_ROOM_AT_TIP: Reason = {
	code: 'rack-tip-too-round',
	text: "The tooth form's tip radius and dedendum leave its rack no tip. Check addendum, dedendum and tip radius."
};

const SHIFT_TOO_LARGE: Reason = {
	code: 'shift-too-large',
	text: 'With this profile shift the rack no longer reaches below the pitch circle. Check the shift.'
};

const UNDERCUT_TOO_DEEP: Reason = {
	code: 'undercut-too-deep',
	text: 'The teeth are undercut so deep that no flank is left below the pitch circle: the method ends. Check teeth, angle and shift, or have the gear rated by an engineer.'
};

const TIP_WORN_AWAY: Reason = {
	code: 'tip-worn-away',
	text: 'The tips are worn below the beginning of the flank: no tooth is left to work out. Check the wear of the tips.'
};

export const TOOTH_POINTED: Reason = {
	code: 'tooth-pointed',
	text: 'The flanks of these teeth meet below the tip circle. Check addendum and profile shift.'
};
