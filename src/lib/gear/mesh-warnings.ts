/** What a mesh that runs should still be told about. */
import { recommendedBacklash } from './backlash';
import type { MeshGeometry } from './contact-path';
import type { Outcome, Reason } from './contract';

/** Shigley, sec. 13-6 (from memory): 1.2 is the usual floor, 1.4 is preferred. */
const LEAST_CONTACT = 1.2;
const PREFERRED_CONTACT = 1.4;

type Mesh = NonNullable<Outcome['mesh']>;

export function meshWarnings(mesh: Mesh, geometry: MeshGeometry): Reason[] {
	const roots = shortenedWarnings(mesh);
	return [contact(mesh), ...roots, rootWarning(mesh, geometry), backlash(mesh, geometry)].filter(
		(reason) => reason !== null
	);
}

/** Below this the two figures read the same. */
const SHORTENED = 0.005;

/** What the roots take from the contact is told beside every verdict, with both figures. */
export function shortenedWarnings({ contactRatio, contactRatioUndercut, overlapRatio }: Mesh): Reason[] {
	if (contactRatioUndercut === null || contactRatio - contactRatioUndercut < SHORTENED) return [];
	const [whole, left] = [contactRatio + overlapRatio, contactRatioUndercut + overlapRatio];
	return [
		{
			code: 'contact-shortened',
			text: `The roots shorten the contact: the flanks begin so high that the contact ratio is ${left.toFixed(2)} instead of ${whole.toFixed(2)}.`,
			values: { left, whole }
		}
	];
}

function contact({ contactRatio, contactRatioUndercut, overlapRatio }: Mesh): Reason | null {
	const total = (contactRatioUndercut ?? contactRatio) + overlapRatio;
	if (total >= PREFERRED_CONTACT) return null;
	const values = { contactRatio: total };
	return total < LEAST_CONTACT
		? {
				code: 'contact-ratio-low',
				text: `The contact ratio is ${total.toFixed(2)}; below ${LEAST_CONTACT} the teeth take over badly. Check the centre distance and the wear of the tips; an engineer should review it.`,
				values
			}
		: {
				code: 'contact-ratio-modest',
				text: `The contact ratio is ${total.toFixed(2)}; ${PREFERRED_CONTACT} or more is preferred.`,
				values
			};
}

/** An undercut root makes room for tips that reach no deeper than a rack's; an internal gear's do. */
function rootWarning({ undercut, interference }: Mesh, { wheel }: MeshGeometry): Reason | null {
	if (!interference) return null;
	return (undercut.gear || undercut.mate) && wheel.kind !== 'internal'
		? {
				code: 'undercut',
				text: 'The teeth of the smaller gear are undercut at the root, where the tips of its mate reach. A hobbed gear has room there; one of another make may not.'
			}
		: {
				code: 'interference',
				text: 'The tips of one gear reach below the flank of the other: they dig in unless the tips are relieved. Check counts, tooth form and centre distance.'
			};
}

/** Nominal thicknesses have no backlash at the nominal distance, so only measured ones are held against the range. */
function backlash({ normalBacklash }: Mesh, { pinion, wheel, centre }: MeshGeometry): Reason | null {
	if (normalBacklash === null || centre === null) return null;
	if (normalBacklash < -1e-6) {
		return {
			code: 'no-backlash',
			text: `The teeth are ${(-normalBacklash).toFixed(2)} mm too thick for this centre distance: they jam. Check the centre distance and the tooth thicknesses.`,
			values: { jam: -normalBacklash }
		};
	}
	if (pinion.toothThickness === null && wheel.toothThickness === null) return null;
	const { least, most } = recommendedBacklash(pinion.normalModule, centre);
	const values = { backlash: normalBacklash, least, most: most ?? least };
	if (normalBacklash < least) {
		return {
			code: 'backlash-below-range',
			text: `The backlash is ${normalBacklash.toFixed(2)} mm; at least ${least.toFixed(2)} mm is recommended. Check the centre distance.`,
			values
		};
	}
	if (most === null || normalBacklash <= most) return null;
	return {
		code: 'backlash-above-range',
		text: `The backlash is ${normalBacklash.toFixed(2)} mm; at most ${most.toFixed(2)} mm is recommended. Look for wear of the flanks and the bearings.`,
		values
	};
}
