/**
 * Which reading to take next: the one that is expected to leave the least doubt among the candidates. For each leading
 * candidate in turn it is imagined to be the gear, the reading to show what that gear would, and the doubt that is left
 * is weighed.
 */
import { fromSI } from '../quantity';
import { memberOf } from '../member';
import { spanTeeth } from '../measure/span';
import { spansOnFlank } from '../measure/span-reach';
import { usualPin } from '../measure/over-pins';
import type { IdentifyInput, NextReading, ReadingName } from './contract';
import { READING_NAMES } from './contract';
import { nuisancesOf, whole } from './nuisances';
import type { Observation } from './observations';
import type { Weighed } from './posterior';
import { predict } from './prediction';

/** Candidates that are imagined to be the gear. */
const LEADING = 10;

/** Less than this drop, in bits, is not worth a hand in the machine. */
const LEAST_DROP = 0.02;

/** Of equal use the easier one first; bits that a reading must gain to be preferred to an easier one. */
const EFFORT: Record<ReadingName, number> = {
	outsideDiameter: 0,
	spans: 0.02,
	wholeDepth: 0.03,
	rootDiameter: 0.03,
	circularPitch: 0.05,
	chordalThickness: 0.08,
	centreDistance: 0.08,
	overPins: 0.12
};

const SIGMA: Record<ReadingName, number> = {
	outsideDiameter: 0.025,
	rootDiameter: 0.05,
	wholeDepth: 0.05,
	spans: 0.025,
	overPins: 0.025,
	chordalThickness: 0.025,
	centreDistance: 0.5,
	circularPitch: 0.25
};

const WHY: Record<ReadingName, string> = {
	outsideDiameter: 'It tells the size of the teeth, and so narrows the pitch.',
	spans:
		'Two spans differ by the base pitch, whatever the teeth have lost: they tell the pressure angle and the pitch.',
	wholeDepth: 'It tells full depth from stub, and the size of the teeth.',
	rootDiameter: 'It tells the depth of the teeth, whatever the tips have lost.',
	circularPitch: 'It tells the pitch roughly, whatever the tips and flanks have lost.',
	chordalThickness: 'It tells the thickness of a tooth, and so the shift.',
	centreDistance: "It tells the pitch from both gears' counts, whatever the teeth have lost.",
	overPins: 'It tells the thickness of the teeth to a hundredth.'
};

type Imagined = Observation[];

export function nextReadingOf(
	input: IdentifyInput,
	weighed: readonly Weighed[],
	place: (one: Weighed) => number | null
): NextReading | null {
	const leading = weighed.slice(0, LEADING).filter(({ probability }) => probability > 0.002);
	const [first] = leading;
	if (!first) return null;
	const options = READING_NAMES.filter((name) => canBeTaken(name, input));
	let best: { name: ReadingName; readings: Imagined; score: number } | null = null;
	for (const name of options) {
		const readings = imagined(name, input, first);
		if (readings.length === 0) continue;
		const drop =
			entropy(leading.map(({ probability }) => probability)) - doubtAfter(readings, input, leading);
		const score = drop - EFFORT[name];
		if (drop >= LEAST_DROP && (!best || score > best.score)) best = { name, readings, score };
	}
	if (!best) return null;
	const { name, readings } = best;
	const [reading, then] = readings;
	if (!reading) return null;
	const unit = input.outsideDiameter?.unit === 'in' || input.prior === 'inch' ? 'in' : 'mm';
	return {
		what: name,
		...(reading.spanTeeth === undefined ? {} : { spanTeeth: reading.spanTeeth }),
		...(then?.spanTeeth === undefined ? {} : { thenSpanTeeth: then.spanTeeth }),
		why: WHY[name],
		expected: expectedOf(reading, input, leading, place).map(({ candidate, value }) => ({
			candidate,
			value: fromSI(value, unit),
			unit
		}))
	};
}

/** What each leading candidate would show, one line a candidate. */
function expectedOf(
	reading: Observation,
	input: IdentifyInput,
	leading: readonly Weighed[],
	place: (one: Weighed) => number | null
): { candidate: number; value: number }[] {
	const told = new Map<number, number>();
	for (const one of leading) {
		const candidate = place(one);
		if (candidate === null || told.has(candidate)) continue;
		told.set(candidate, showing(reading, input, one).middle);
	}
	return [...told].map(([candidate, value]) => ({ candidate, value }));
}

function canBeTaken(name: ReadingName, input: IdentifyInput): boolean {
	if (input.cannotMeasure?.includes(name)) return false;
	if (name === 'spans') return (input.spans ?? []).length < 2;
	if (name === 'centreDistance') return input.mateTeeth !== undefined && !input.centreDistance;
	// Pins are for a spur gear, and a reading that was taken is taken.
	if (name === 'overPins' && input.helixAngle && input.helixAngle.value !== 0) return false;
	return input[name] === undefined;
}

/** Spans are worth most in two: what the pair would show is weighed, and the first that is missing is asked for. */
function imagined(name: ReadingName, input: IdentifyInput, leading: Weighed): Imagined {
	const plain: Observation = { reading: name, value: 0, sigma: SIGMA[name] };
	if (name === 'overPins') return [{ ...plain, pin: usualPin(leading.hypothesis.kind.module) }];
	if (name !== 'spans') return [plain];
	const taken = input.spans?.[0]?.teeth;
	const { k, fewest, most } = recommendedSpans(leading);
	const onFlank = (count: number) => count >= fewest && count <= most;
	if (taken !== undefined) {
		const neighbour = onFlank(taken + 1) ? taken + 1 : taken - 1;
		return neighbour >= 2 ? [{ ...plain, spanTeeth: neighbour }] : [];
	}
	const pair = onFlank(k + 1) ? [k, k + 1] : onFlank(k - 1) ? [k - 1, k] : [k];
	return pair.map((spanTeeth) => ({ ...plain, spanTeeth }));
}

/** Teeth to span on a candidate, the jaws near the middle of the flanks, and between which counts they touch flanks. */
function recommendedSpans({ hypothesis, evidence }: Weighed): { k: number; fewest: number; most: number } {
	const { kind, teeth, helixAngle } = hypothesis;
	const member = memberOf({
		kind: helixAngle === 0 ? 'spur' : 'helical',
		teeth,
		pitch: { system: 'module', value: kind.module },
		plane: 'normal',
		pressureAngle: kind.pressureAngle,
		form: kind.form,
		profileShift: evidence.shift,
		helixAngle: (helixAngle * 180) / Math.PI
	});
	const k = spanTeeth({ ...member, teeth });
	const reach = spansOnFlank(member) ?? { fewest: k, most: k };
	return { k: Math.min(Math.max(k, reach.fewest), reach.most), ...reach };
}

/** Middle and width of what a candidate would show, mm; shift and losses as far as the readings leave them. */
function showing(
	reading: Observation,
	input: IdentifyInput,
	{ hypothesis, evidence }: Weighed
): { middle: number; width: number } {
	const of = predict(reading, hypothesis);
	const { shift, thickness, helix } = nuisancesOf(input, hypothesis.teeth);
	const middle =
		of.nominal +
		of.shift * evidence.shift +
		of.tip * evidence.tip +
		of.thickness * evidence.thickness +
		of.helix * evidence.helix;
	// Once a diameter is known the shift is known to a few hundredths and the helix to a fifth of its doubt; the
	// thickness only once a span is.
	const unseen = Math.hypot(
		of.shift * (input.outsideDiameter ? 0.02 : whole(shift).spread),
		of.thickness * ((input.spans ?? []).length > 0 ? 0.01 : whole(thickness).spread),
		of.helix * (input.outsideDiameter ? 0.2 : 1) * helix
	);
	return { middle, width: Math.hypot(reading.sigma, of.own, unseen) };
}

/** Expected entropy in bits after the readings, over the leading candidates as truth and a little to either side. */
function doubtAfter(readings: Imagined, input: IdentifyInput, leading: readonly Weighed[]): number {
	const all = leading.reduce((sum, { probability }) => sum + probability, 0);
	const shown = leading.map((one) => readings.map((reading) => showing(reading, input, one)));
	// Of two spans the difference is free of the thickness: seen as its own reading, with only the tool's doubt.
	const features = shown.map((each) => {
		const [one, two] = each;
		if (!one || !two) return each;
		const doubt = Math.hypot(...readings.map(({ sigma }) => sigma));
		return [{ middle: two.middle - one.middle, width: doubt }, one];
	});
	let expected = 0;
	leading.forEach((truth, t) => {
		for (const off of [-1, 0, 1]) {
			const posterior = leading.map((candidate, c) => {
				let log = Math.log(candidate.probability);
				features[c]?.forEach(({ middle, width }, f) => {
					const true_ = features[t]?.[f];
					const value = (true_?.middle ?? 0) + off * (true_?.width ?? 0);
					log -= ((value - middle) / width) ** 2 / 2 + Math.log(width);
				});
				return log;
			});
			const highest = Math.max(...posterior);
			const weights = posterior.map((log) => Math.exp(log - highest));
			expected += ((truth.probability / all) * entropy(weights)) / 3;
		}
	});
	return expected;
}

function entropy(weights: readonly number[]): number {
	const all = weights.reduce((sum, weight) => sum + weight, 0);
	return weights.reduce((sum, weight) => {
		const share = weight / all;
		return share > 0 ? sum - share * Math.log2(share) : sum;
	}, 0);
}
