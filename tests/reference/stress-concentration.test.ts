/**
 * Dolan and Broghamer's factor on the section that the core finds, through the geometry factor J that is published for
 * both together: J = Y / Kf with Y = 1 / (cos φL / cos φ (6 h / t² - tan φL / t)), load at the tip, no load sharing.
 */
import { expect, test } from 'vitest';
import { lewisFormFactorByGeometry } from '$lib/gear/form-factor-geometry';
import type { BasicRack } from '$lib/gear/rack';
import { stressConcentration } from '$lib/gear/stress-concentration';
import { generateTooth, halfThicknessAngle, pressureAngleAt } from '$lib/gear/tooth';

const pressureAngle = Math.PI / 9;

/** Teeth thinned by 0.024 modules, as the tables take them: the rack goes deeper, the blank keeps its size. */
const profileShift = -0.012 / Math.tan(pressureAngle);
const rack: BasicRack = { addendum: 1 - profileShift, dedendum: 1.25, tipRadius: 0.25, pressureAngle };

// AGMA 908-B89, spur, 20 degrees, equal addenda, load at the tip; the values and the tool are from memory.
test.each([
	[21, 0.24],
	[35, 0.26],
	[55, 0.28],
	[135, 0.29]
])('J of %d teeth: %d', (teeth, published) => {
	const shape = { teeth, rack, profileShift, tipWear: 0 };
	const [section, tooth] = [lewisFormFactorByGeometry(shape), generateTooth(shape)];
	if ('code' in section || 'code' in tooth) throw new Error('refused');
	const { thickness: t, height: h } = section;
	const { baseRadius, tipRadius } = tooth;
	const load = pressureAngleAt(baseRadius, tipRadius) - halfThicknessAngle(tooth, tipRadius);
	const Y = 1 / ((Math.cos(load) / Math.cos(pressureAngle)) * ((6 * h) / t ** 2 - Math.tan(load) / t));
	const J = Y / (stressConcentration(section, pressureAngle) ?? NaN);
	// Published to two figures.
	expect(Math.abs(J - published)).toBeLessThan(0.006);
});
