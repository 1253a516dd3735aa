/** Where a rack stands beside the pinion that runs on it: its tips, and its reference line. Lengths in mm, angles in radians. */
import { tangent, toDegrees } from './degrees';
import { involute } from './involute';
import { baseDiameter, type Member } from './member';
import { SOURCES } from './sources';
import { nominalThickness } from './thickness';
import { unrecorded, type Recorder } from './working';

const source = SOURCES.mesh;

/**
 * From the pinion's rolling circle to the rack's tips. The rack stands without backlash: its space, which widens
 * towards the tips, is as wide at the rolling circle as the pinion's tooth. So a shift of the rack itself moves nothing.
 */
export function rackReach(pinion: Member, rack: Member, recorder: Recorder): number {
	return recorder.step(
		{
			symbol: 'h',
			name: "from the pinion's rolling circle to the rack's tips",
			expression: 'ha · mn - w - e',
			unit: 'mm',
			source
		},
		{
			ha: rack.rack.addendum,
			mn: rack.normalModule,
			w: rack.tipWear,
			e: rackApart(pinion, rack, recorder)
		},
		({ ha, mn, w, e }) => ha * mn - w - e
	);
}

/** How far the rack's reference line lies beyond the pinion's rolling circle, mm: x mn between alike members. */
export function rackApart(pinion: Member, rack: Member, recorder: Recorder = unrecorded): number {
	const angle = rack.transverseAngle;
	const rolling = (baseDiameter(pinion) ?? 0) / 2 / Math.cos(angle);
	const nominal = nominalThickness(pinion.normalModule, pinion.profileShift, pinion.normalAngle);
	const onReference = nominal / Math.cos(pinion.helixAngle) / (pinion.pitchDiameter ?? NaN);
	const thickness = 2 * rolling * (onReference + involute(pinion.transverseAngle) - involute(angle));
	return recorder.step(
		{
			symbol: 'e',
			name: "from the pinion's rolling circle to the rack's reference line",
			expression: '(sw - π · m2 / 2) / (2 · tan(αw))',
			unit: 'mm',
			source
		},
		{
			sw: recorder.step(
				{
					symbol: 'sw',
					name: "thickness of the pinion's teeth on its rolling circle",
					expression: 'rb1 · (st / r1 + 2 · (tan(α1) - tan(αw)) - π · (α1 - αw) / 90) / cos(αw)',
					unit: 'mm',
					source
				},
				{
					rb1: (baseDiameter(pinion) ?? 0) / 2,
					st: nominal / Math.cos(pinion.helixAngle),
					r1: (pinion.pitchDiameter ?? NaN) / 2,
					α1: toDegrees(pinion.transverseAngle),
					αw: toDegrees(angle)
				},
				() => thickness
			),
			m2: rack.transverseModule,
			αw: toDegrees(angle)
		},
		({ sw, m2, αw }) => (sw - (Math.PI / 2) * m2) / (2 * tangent(αw))
	);
}
