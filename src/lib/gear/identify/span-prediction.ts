/**
 * What a gear of a kind would show over k teeth: the base tangent where the jaws find flanks, and where they do not,
 * less at the tips and anything near at the roots. Lengths in mm, angles in radians.
 */
import { involute } from '../involute';
import { basePitch } from '../measure/span';
import { cornerSlope, flankOf, shortAtTips } from '../measure/span-reach';
import type { Hypothesis, Prediction } from './hypothesis';

/**
 * Span in the normal plane with its slopes. dW/dβ = mn N sin αn sin² αt tan β / cos β, from inv αt with
 * tan αt = tan αn / cos β (derived here).
 *
 * Past the tips the corners of the teeth are touched. That reading is well defined and counted as it would really be; its
 * doubt is how far chamfer, rounding and wear may have moved the corner. At the roots jaws of unknown depth touch a
 * fillet or hang above it, so that no one reading is to be expected: the formula's stands, with a doubt that grows with
 * the way past and soon tells nothing. All begins at zero, so that no gear is excluded for lying beside the limit. Jaws
 * on corners are plain to see and seldom: else wheels that are no involute gears would hide behind them.
 */
export function spanPrediction(k: number, hypothesis: Hypothesis): Prediction {
	const { kind, teeth, helixAngle, rise } = hypothesis;
	const m = kind.module;
	const angle = (kind.pressureAngle * Math.PI) / 180;
	const [sine, cosine] = [Math.sin(angle), Math.cos(angle)];
	const transverse = Math.atan(Math.tan(angle) / Math.cos(helixAngle));
	const full = basePitch(m, angle) * (k - 0.5) + m * cosine * teeth * involute(transverse);
	const shift = 2 * m * sine;
	// Tips that stand out further were cut so; that stand less far out may as well be worn.
	const profileShift = Math.max(0, rise);
	const pitchRadius = (m * teeth) / (2 * Math.cos(helixAngle));
	const addendum = kind.form === 'stub' ? 0.8 : 1;
	const flank = flankOf({
		pitchRadius,
		tipRadius: pitchRadius + m * (addendum + rise),
		// The rack's flank is straight for the addendum's depth at least.
		depth: m * (addendum - profileShift),
		normalAngle: angle,
		transverseAngle: transverse,
		helixAngle
	});
	const span = full + shift * profileShift;
	const short = shortAtTips(span, flank);
	const intoRoot = Math.max(0, flank.from + NEAR_ROOT * m - (span * flank.baseHelixCosine) / 2);
	return {
		nominal: full - short,
		shift,
		tip: 0,
		thickness: -m * cosine,
		helix: (m * teeth * sine * Math.sin(transverse) ** 2 * Math.tan(helixAngle)) / Math.cos(helixAngle),
		logChance: LOG_ON_CORNERS * Math.min(1, short / (PLAINLY * m)) + LOG_IN_ROOT * Math.min(1, intoRoot / m),
		own: Math.hypot(0.004 * m, cornerSlope(span, flank) * CORNER * m, ROOT_DOUBT * intoRoot)
	};
}

/** How often jaws are put on the corners of tips, and down to fillets. From memory of shop practice. */
const LOG_ON_CORNERS = Math.log(0.003);
const LOG_IN_ROOT = Math.log(0.2);

/** Short of the formula by so much, in modules, a span is plainly on corners. */
const PLAINLY = 0.02;

/** How far a corner may stand from where flank and tip circle meet, in modules along the base tangent. */
const CORNER = 0.1;

/** From so far before the end of the flank, in modules along the base tangent, the jaws' depth begins to matter. */
const NEAR_ROOT = 1;

/** Of the way from there; what a drawn tooth shows between jaws at its bottom and jaws half a module above (tests). */
const ROOT_DOUBT = 0.05;
