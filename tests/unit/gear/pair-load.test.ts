/**
 * One dynamic load for both members of a pair: the harsher of their velocity laws counts, whoever of the two is asked
 * about, within the range of both; the working says whose law it is.
 */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { EvaluateInput, Finish, Gear, Mate, Outcome, Rules } from '$lib/gear/contract';
import { evaluate } from '$lib/gear/evaluate';
import { within } from './check-arbitrary';

const steel = (brinell = 200): Gear['material'] => ({
	name: `steel of ${brinell}`,
	metallic: true,
	allowableBending: { value: 138, unit: 'MPa' },
	brinell,
	modulus: { value: 207, unit: 'GPa' },
	poisson: 0.3,
	permitted: true
});

const nylon: Gear['material'] = {
	name: 'nylon',
	metallic: false,
	allowableBending: { value: 40, unit: 'MPa' },
	permitted: true
};

/** A gear with all that its mate can be asked about too. */
type Side = Gear & { teeth: number };

const pinion: Side = {
	kind: 'spur',
	teeth: 24,
	pitch: { system: 'module', value: 4 },
	pressureAngle: 20,
	form: 'full-depth',
	faceWidth: { value: 40, unit: 'mm' },
	finish: 'hobbed',
	material: steel()
};
const wheel: Side = { ...pinion, teeth: 48, material: nylon };

const FORCE = { tangentialForce: { value: 1000, unit: 'N' } } as const;

/** `rpm` is the pinion's, so that both ways round are the same drive. */
function asked(
	gear: Side,
	mate: Side,
	{ rpm, load = FORCE, rules }: { rpm: number; load?: EvaluateInput['drive']['load']; rules?: Partial<Rules> }
): EvaluateInput {
	return {
		gear,
		mate,
		drive: {
			load,
			speed: { value: (rpm * Math.min(gear.teeth, mate.teeth)) / gear.teeth, unit: 'rpm' },
			serviceFactor: 1
		},
		rules
	};
}

const codes = ({ reasons }: Outcome) => reasons.map(({ code }) => code);

describe('steel on nylon, 1,000 N at 1,500 rpm of the steel', () => {
	const fromSteel = evaluate(asked(pinion, wheel, { rpm: 1500 }));
	const fromNylon = evaluate(asked(wheel, pinion, { rpm: 1500 }));

	test('the law of non-metallic gears counts from either side: Kv 2.9493, by Machinery’s Handbook (from memory)', () => {
		// V = π 96 1500 / 60000 = 7.539822 m/s = 1484.217 ft/min; 1 / (150 / 1684.217 + 0.25) = 2.949310
		for (const outcome of [fromSteel, fromNylon]) {
			expect(outcome.velocityLaw).toBe('non-metallic');
			expect(outcome.velocityFactor).toBeCloseTo(2.94931, 5);
			expect(outcome.verdict).toBe('will-not-carry');
		}
		expect(fromSteel.limitedBy).toBe('mate-bending');
		expect(fromNylon.limitedBy).toBe('gear-bending');
	});

	test('the working holds both factors, says whose each is, and takes the higher', () => {
		const lines = fromSteel.working.filter(({ symbol }) => /^Kv/.test(symbol));
		expect(lines.map(({ symbol, name, of }) => [symbol, name, of])).toEqual([
			['Kv1', 'velocity factor, hobbed law', undefined],
			['Kv2', 'velocity factor, non-metallic law', 'mate'],
			['Kv', 'velocity factor of the pair, the higher of both', undefined]
		]);
		expect(lines[2]?.value).toBe(lines[1]?.value);
		expect(fromNylon.working.find(({ symbol }) => symbol === 'Kv1')?.value).toBe(lines[1]?.value);
	});

	test("a person is told that it is the mate's law, and only where it is", () => {
		const told = fromSteel.reasons.find(({ code }) => code === 'mate-law-counts');
		expect(told?.text).toContain('non-metallic');
		expect(told?.values).toEqual({ law: 'non-metallic' });
		expect(codes(fromNylon)).not.toContain('mate-law-counts');
	});

	test('a nylon mate of no stated finish still has its law', () => {
		const { finish: _finish, ...mate } = wheel;
		const input = asked(pinion, wheel, { rpm: 1500 });
		expect(evaluate({ ...input, mate }).velocityFactor).toBe(fromSteel.velocityFactor);
	});
});

describe("the mate's finish", () => {
	const pair = (own: Finish, mates: Finish | undefined, rpm = 800): EvaluateInput => {
		const input = asked({ ...pinion, finish: own }, { ...wheel, material: steel() }, { rpm });
		return { ...input, mate: { ...input.mate, finish: mates } as Mate };
	};

	test('a rougher mate makes the load that of its own law', () => {
		const alone = evaluate(pair('hobbed', undefined));
		const rough = evaluate(pair('hobbed', 'cast'));
		// V = π 96 800 / 60000 / 0.00508 = 791.582 ft/min; cast (600 + V) / 600 = 2.319304
		expect(rough.velocityFactor).toBeCloseTo(2.319304, 5);
		expect(rough.velocityLaw).toBe('cast');
		expect(rough.bendingMargin).toBeCloseTo(
			((alone.bendingMargin ?? NaN) * (alone.velocityFactor ?? NaN)) / (rough.velocityFactor ?? NaN),
			9
		);
		expect(codes(rough)).toContain('mate-law-counts');
	});

	test("a smoother or unknown one leaves the gear's own", () => {
		const alone = evaluate(pair('cut', undefined));
		expect(alone.velocityLaw).toBe('cut');
		const smooth = evaluate(pair('cut', 'ground'));
		expect(smooth).toMatchObject({ velocityLaw: 'cut', velocityFactor: alone.velocityFactor });
		expect(codes(smooth)).not.toContain('mate-law-counts');
		// One law on both sides needs one line.
		const same = evaluate(pair('cut', 'cut'));
		expect(same.working).toEqual(alone.working);
	});

	test("the range is that of both: beyond the mate's there is no answer, and the sentence says whose it is", () => {
		// The law for cast teeth ends at 1,000 ft/min, 1,011 rpm here.
		const beyond = evaluate(pair('hobbed', 'cast', 1100));
		expect(beyond).toMatchObject({ verdict: 'cannot-say', velocityFactor: null });
		expect(beyond.reasons[0]).toMatchObject({ code: 'mate-speed-beyond-law', values: { law: 'cast' } });
		expect(beyond.reasons[0]?.text).toContain("the mate's cast teeth");
		const other = evaluate(pair('cast', 'hobbed', 1100));
		expect(other.reasons[0]?.code).toBe('speed-beyond-law');
		expect(evaluate(pair('hobbed', undefined, 1100)).verdict).not.toBe('cannot-say');
	});

	test('a limit of the plant counts for either finish', () => {
		const speedLimit = { cast: null, cut: null, hobbed: null, ground: { value: 3, unit: 'm/s' as const } };
		for (const [own, mates, code] of [
			['hobbed', 'ground', 'mate-speed-beyond-law'],
			['ground', 'hobbed', 'speed-beyond-law']
		] as const) {
			const outcome = evaluate({ ...pair(own, mates), rules: { speedLimit } });
			expect(codes(outcome)[0]).toBe(code);
			expect(outcome.reasons[0]?.text).toContain('the plant allows');
		}
	});

	test('without a speed a law is named only where there is one', () => {
		const still = ({ drive: { speed: _speed, ...drive }, ...rest }: EvaluateInput) => ({ ...rest, drive });
		expect(evaluate(still(pair('hobbed', 'hobbed'))).velocityLaw).toBe('hobbed');
		expect(evaluate(still(pair('hobbed', 'cast'))).velocityLaw).toBeNull();
	});

	test('no better finish is offered than the mate lets count', () => {
		const short = (mates: Finish): EvaluateInput => {
			const input = pair('cut', mates, 1500);
			const margin = Math.min(...evaluate(input).limits.map((limit) => limit.margin));
			// Just short of what the gear needs with cut teeth, so that hobbed ones would do.
			return { ...input, drive: { ...input.drive, serviceFactor: margin * 1.02 } };
		};
		const finishes = (mates: Finish) =>
			evaluate(short(mates))
				.remedies.filter(({ change }) => change === 'finish')
				.map(({ value }) => value);
		expect(finishes('cut')).toEqual([]);
		// Against a hobbed mate, ground teeth are no better than hobbed ones.
		expect(finishes('hobbed')).toEqual(['hobbed']);
		expect(finishes('ground')).toEqual(['hobbed', 'ground']);
	});
});

describe('for every pair', () => {
	const side = (teeth: fc.Arbitrary<number>): fc.Arbitrary<Side> =>
		fc
			.record({
				teeth,
				face: within(10, 60),
				finish: fc.constantFrom<Finish>('cast', 'cut', 'hobbed', 'ground'),
				metallic: fc.boolean(),
				allowable: within(20, 300),
				brinell: within(150, 400)
			})
			.map(({ teeth, face, finish, metallic, allowable, brinell }) => ({
				...pinion,
				teeth,
				faceWidth: { value: face, unit: 'mm' },
				finish,
				material: { ...steel(brinell), metallic, allowableBending: { value: allowable, unit: 'MPa' } }
			}));
	const limit = fc.option(
		within(0.5, 40).map((value) => ({ value, unit: 'm/s' as const })),
		{ nil: null, freq: 3 }
	);
	const drive = fc.record({
		rpm: within(0.1, 2500),
		load: fc.oneof(
			within(10, 20_000).map((value) => ({ tangentialForce: { value, unit: 'N' as const } })),
			within(0.1, 50).map((value) => ({ power: { value, unit: 'kW' as const } }))
		),
		rules: fc.record({
			cutLaw: fc.constantFrom<Rules['cutLaw']>(600, 1200),
			speedLimit: fc.record({ cast: limit, cut: limit, hobbed: limit, ground: limit })
		})
	});
	const pairs = fc.record({
		gear: side(fc.integer({ min: 18, max: 40 })),
		mate: side(fc.integer({ min: 41, max: 120 })),
		drive
	});
	const ROLE = { 'gear-bending': 'mate-bending', 'mate-bending': 'gear-bending', wear: 'wear' } as const;

	function expectClose(a: number | null, b: number | null): void {
		if (a === null || b === null) return expect(a).toBe(b);
		expect(Math.abs(a / b - 1), `${a} and ${b}`).toBeLessThan(1e-9);
	}

	test('the answer is the same from either side, of unequal finishes and materials', () => {
		let answered = 0;
		fc.assert(
			fc.property(pairs, ({ gear, mate, drive }) => {
				const [one, other] = [evaluate(asked(gear, mate, drive)), evaluate(asked(mate, gear, drive))];
				expect(other.verdict).toBe(one.verdict);
				expect(other.velocityLaw).toBe(one.velocityLaw);
				expectClose(other.velocityFactor, one.velocityFactor);
				expectClose(other.permittedPower, one.permittedPower);
				expect(other.limits).toHaveLength(one.limits.length);
				for (const { answer, margin, marginLow } of one.limits) {
					const same = other.limits.find((limit) => limit.answer === ROLE[answer]);
					expectClose(same?.margin ?? NaN, margin);
					expectClose(same?.marginLow ?? NaN, marginLow);
				}
				if (one.limits.length > 0) answered++;
			}),
			{ numRuns: 1000 }
		);
		expect(answered).toBeGreaterThan(300);
	});

	test('a mate never makes the load lighter or the range longer', () => {
		fc.assert(
			fc.property(pairs, ({ gear, mate, drive }) => {
				const { mate: _mate, ...alone } = asked(gear, mate, drive);
				const [paired, single] = [evaluate(asked(gear, mate, drive)), evaluate(alone)];
				if (single.velocityFactor === null) expect(paired.velocityFactor).toBeNull();
				if (paired.velocityFactor === null) return;
				expect(paired.velocityFactor).toBeGreaterThanOrEqual(single.velocityFactor ?? NaN);
			}),
			{ numRuns: 1000 }
		);
	});

	test.each([
		['steel', pinion, wheel],
		['nylon', wheel, pinion]
	])(
		'the bad end moves without a jump where one law takes over from the other, from the %s',
		(_of, gear, mate) => {
			// Cut on non-metallic teeth: the laws cross near 2,925 ft/min. Steps of 0.06 % around it.
			const input = asked({ ...gear, finish: 'cut' }, { ...mate, finish: 'cut' }, { rpm: 2956 });
			const middle = input.drive.speed?.value ?? NaN;
			const lows = Array.from({ length: 200 }, (_, step) => {
				const speed = { value: middle * (0.9 + step * 0.0006), unit: 'rpm' as const };
				return evaluate({
					...input,
					drive: { ...input.drive, speed },
					uncertainty: { faceWidth: 0, load: 0, speed: 0.15 }
				});
			});
			const laws = new Set(lows.map(({ velocityLaw }) => velocityLaw));
			expect([...laws].sort()).toEqual(['cut', 'non-metallic']);
			lows.slice(1).forEach((outcome, i) => {
				const before = lows[i]?.bendingMarginLow ?? NaN;
				expect(Math.abs((outcome.bendingMarginLow ?? NaN) / before - 1)).toBeLessThan(0.003);
			});
		}
	);
});
