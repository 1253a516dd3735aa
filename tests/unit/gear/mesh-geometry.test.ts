/**
 * A mesh against the plain geometry of circles and flanks, from either side, and at the ends of what the schema lets
 * through.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { contactPath, interferes, type MeshGeometry } from '$lib/gear/contact-path';
import type { ToothedPart } from '$lib/gear/contract';
import { memberOf, tipDiameter, type Member } from '$lib/gear/member';
import { meshOf } from '$lib/gear/mesh';
import { operatingOf } from '$lib/gear/operating';
import { arcThickness } from '$lib/gear/thickness';
import { unrecorded, Working } from '$lib/gear/working';
import { within } from './check-arbitrary';

const RUNS = { numRuns: 1000 };
const involute = (angle: number) => Math.tan(angle) - angle;
const mm = (value: number) => ({ value, unit: 'mm' as const });

const part = (of: Partial<ToothedPart>): Member =>
	memberOf({
		kind: 'spur',
		pitch: { system: 'module', value: 4 },
		pressureAngle: 20,
		form: 'full-depth',
		...of
	});

const meshed = (gear: Member, mate: Member, centreDistance: number | null) =>
	meshOf({ gear, mate, centreDistance, faceWidth: 40 }, unrecorded);
const codes = (reasons: { code: string }[]) => reasons.map(({ code }) => code);

/**
 * The path of contact found again: the line of action is walked in small steps, and a place counts where a flank of
 * either exists, which its distance from both centres tells.
 */
function walked({ pinion, wheel, centre, operatingAngle }: MeshGeometry): number {
	const base = ((pinion.pitchDiameter ?? NaN) / 2) * Math.cos(pinion.transverseAngle);
	const tip = (tipDiameter(pinion) ?? NaN) / 2;
	const rolling = base / Math.cos(operatingAngle);
	const [sine, cosine] = [Math.sin(operatingAngle), Math.cos(operatingAngle)];
	const onWheel = (x: number, y: number, along: number): boolean => {
		if (centre === null) {
			const reference = (pinion.pitchDiameter ?? NaN) / 2 + pinion.profileShift * pinion.normalModule;
			return y >= reference - wheel.rack.addendum * wheel.normalModule + wheel.tipWear;
		}
		const wheelTip = (tipDiameter(wheel) ?? NaN) / 2;
		const between = centre * Math.sin(operatingAngle);
		return wheel.kind === 'internal'
			? Math.hypot(x, y + centre) >= wheelTip
			: Math.hypot(x, y - centre) <= wheelTip && along <= between;
	};
	const step = pinion.transverseModule / 2000;
	let length = 0;
	// From the pinion's base circle outwards; the pitch point is at (0, rolling).
	for (let along = step / 2; along < 2 * tip; along += step) {
		const beyondPitchPoint = along - rolling * sine;
		const [x, y] = [-beyondPitchPoint * cosine, rolling + beyondPitchPoint * sine];
		if (Math.hypot(x, y) <= tip && onWheel(x, y, along)) length += step;
	}
	return length;
}

const pairs = fc.record({
	kind: fc.constantFrom('spur' as const, 'internal' as const, 'rack' as const),
	teeth: fc.integer({ min: 8, max: 60 }),
	more: fc.integer({ min: 0, max: 120 }),
	pressureAngle: within(14.5, 25),
	addendum: within(0.6, 1.2),
	shift: within(-0.4, 0.6),
	tipWear: within(0, 0.4),
	apart: fc.option(within(0, 0.3))
});

function pairFrom(of: typeof pairs extends fc.Arbitrary<infer P> ? P : never): MeshGeometry | null {
	const form = { addendum: of.addendum, dedendum: 1.25, tipRadius: 0.2 };
	const common = { pressureAngle: of.pressureAngle, form, tipWear: mm(of.tipWear) };
	const gear = part({ ...common, teeth: of.teeth, profileShift: of.shift });
	const more = of.kind === 'internal' ? of.more + 12 : of.more;
	const mate = part({ ...common, kind: of.kind, teeth: of.kind === 'rack' ? undefined : of.teeth + more });
	const nominal = operatingOf({ gear, mate, centreDistance: null }, unrecorded);
	if (!nominal || nominal.centre === null || of.apart === null) return nominal;
	// Apart is away from the pitch point: outwards, and inwards for an internal wheel.
	const centreDistance = nominal.centre + (of.kind === 'internal' ? -of.apart : of.apart);
	return operatingOf({ gear, mate, centreDistance }, unrecorded);
}

describe('against plain geometry', () => {
	test('the path of contact is where both have a flank', () => {
		fc.assert(
			fc.property(pairs, (of) => {
				const geometry = pairFrom(of);
				fc.pre(geometry !== null);
				const found = walked(geometry);
				expect(Math.abs(contactPath(geometry) - found)).toBeLessThanOrEqual(4 / 500);
			}),
			{ numRuns: 200 }
		);
	});

	test('it is shorter than from tip to tip just where tips interfere', () => {
		fc.assert(
			fc.property(pairs, (of) => {
				const geometry = pairFrom(of);
				fc.pre(geometry !== null && of.kind === 'spur');
				const { pinion, wheel, centre, operatingAngle } = geometry;
				const tangentToTip = (member: Member) => {
					const base = ((member.pitchDiameter ?? NaN) / 2) * Math.cos(member.transverseAngle);
					return Math.sqrt(Math.max(0, ((tipDiameter(member) ?? NaN) / 2) ** 2 - base ** 2));
				};
				const tipToTip =
					tangentToTip(pinion) + tangentToTip(wheel) - (centre ?? NaN) * Math.sin(operatingAngle);
				fc.pre(tipToTip > 0);
				expect(contactPath(geometry) < tipToTip - 1e-6).toBe(interferes(geometry));
			}),
			RUNS
		);
	});

	test('backlash is what the base circles leave: pb ± (db1 ± db2) inv αw - sb1 - sb2', () => {
		fc.assert(
			fc.property(pairs, within(0, 0.2), (of, thinned) => {
				const geometry = pairFrom(of);
				fc.pre(geometry !== null && of.kind !== 'rack' && geometry.centre !== null);
				const { pinion, wheel, centre, operatingAngle } = geometry;
				const thin = { ...pinion, toothThickness: arcThickness(pinion) - thinned };
				const { figures } = meshed(thin, wheel, centre);
				fc.pre(figures !== null);
				const sign = wheel.kind === 'internal' ? -1 : 1;
				const onBase = (member: Member, sense: number) => {
					const d = member.pitchDiameter ?? NaN;
					return (
						d *
						Math.cos(member.transverseAngle) *
						(arcThickness(member) / d + sense * involute(member.transverseAngle))
					);
				};
				const [db1, db2] = [pinion, wheel].map(
					({ pitchDiameter, transverseAngle }) => (pitchDiameter ?? NaN) * Math.cos(transverseAngle)
				) as [number, number];
				const pitch = (Math.PI * db1) / (pinion.teeth ?? NaN);
				const left =
					pitch + (db1 + sign * db2) * involute(operatingAngle) - onBase(thin, 1) - onBase(wheel, sign);
				expect(Math.abs((figures.normalBacklash ?? NaN) - left)).toBeLessThanOrEqual(2e-6);
			}),
			RUNS
		);
	});
});

const anyPart = fc.record({
	kind: fc.constantFrom('spur' as const, 'helical' as const, 'internal' as const, 'rack' as const),
	teeth: fc.integer({ min: 1, max: 5000 }),
	pressureAngle: within(5, 45),
	module: within(0.05, 250),
	helixAngle: within(0, 60),
	plane: fc.constantFrom('normal' as const, 'transverse' as const),
	profileShift: within(-2, 2),
	form: fc.oneof(
		fc.constantFrom('full-depth' as const, 'stub' as const),
		fc.record({ addendum: within(0.1, 2), dedendum: within(0.1, 2.5), tipRadius: within(0, 1) })
	),
	tipWear: fc.option(within(1e-3, 1e4).map(mm), { nil: undefined }),
	toothThickness: fc.option(within(1e-3, 1e4).map(mm), { nil: undefined })
});

describe('whatever the schema lets through', () => {
	const members = fc.tuple(anyPart, anyPart, fc.boolean()).map(([one, other, alike]): [Member, Member] => {
		const of = ({ module, teeth, helixAngle, ...rest }: typeof one) =>
			part({
				...rest,
				pitch: { system: 'module', value: module },
				teeth: rest.kind === 'rack' ? undefined : teeth,
				helixAngle: rest.kind === 'spur' ? 0 : helixAngle
			});
		if (!alike) return [of(one), of(other)];
		const { kind, module, pressureAngle, helixAngle, plane } = one;
		const straight = kind === 'spur' || other.kind === 'spur' ? 0 : helixAngle;
		return [
			of({ ...one, helixAngle: straight }),
			of({ ...other, module, pressureAngle, helixAngle: straight, plane })
		];
	});
	const centres = fc.option(fc.oneof(within(1e-3, 1e6), within(0.9, 1.1)));

	/** A centre distance as measured: anything, or near the nominal one. */
	function centreOf([gear, mate]: [Member, Member], of: number | null): number | null {
		if (of === null || of < 0.9 || of > 1.1) return of;
		return operatingOf({ gear, mate, centreDistance: null }, unrecorded)?.centre ?? of;
	}

	test('the figures are finite, and without them there is a refusal', () => {
		fc.assert(
			fc.property(members, centres, within(0.1, 2e4), (pair, of, faceWidth) => {
				const [gear, mate] = pair;
				const working = new Working();
				const question = { gear, mate, centreDistance: centreOf(pair, of), faceWidth };
				const { figures, refusals } = meshOf(question, working);
				if (figures === null) expect(refusals.length).toBeGreaterThan(0);
				for (const value of Object.values(figures ?? {})) {
					if (typeof value === 'number') expect(Number.isFinite(value)).toBe(true);
				}
				expect(figures?.contactRatio ?? 0).toBeGreaterThanOrEqual(0);
				for (const { numbers } of working.lines) expect(numbers).not.toMatch(/NaN|Infinity|undefined/);
			}),
			{ numRuns: 3000 }
		);
	});

	test('gear and mate change places without changing the mesh', () => {
		fc.assert(
			fc.property(members, centres, (pair, of) => {
				const [gear, mate] = pair;
				fc.pre(gear.teeth !== mate.teeth);
				const centre = centreOf(pair, of);
				const [one, other] = [meshed(gear, mate, centre), meshed(mate, gear, centre)];
				expect(codes(other.refusals)).toEqual(codes(one.refusals));
				expect(other.warnings).toEqual(one.warnings);
				const swapped = other.figures && {
					...other.figures,
					undercut: { gear: other.figures.undercut.mate, mate: other.figures.undercut.gear }
				};
				expect(swapped).toEqual(one.figures);
			}),
			RUNS
		);
	});
});
