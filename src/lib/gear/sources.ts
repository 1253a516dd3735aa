/**
 * The books that the working names, once. Editions are from memory where the text that was read did not print
 * one; each string says so.
 */
export const SOURCES = {
	reading: 'as given',
	geometry: 'definition; Mott, Machine Elements in Mechanical Design, 4th ed., p. 319',
	units: 'exact: 1 ft/min = 0.00508 m/s; NIST SP 811 (2008), appendix B (from memory)',
	mechanics: 'mechanics; Wentzell, Machine Design, ch. 12',
	velocityFactor:
		"Barth's velocity factor; Shigley, Mechanical Engineering Design, 8th ed., ch. 14 (edition from memory)",
	commercialCut:
		"Barth's velocity factor, commercial cut teeth; Wentzell, Machine Design, ch. 12; Faires, Design of Machine Elements, 4th ed. (edition from memory)",
	nonMetallic: "velocity factor of non-metallic gears; Machinery's Handbook (from memory)",
	lewisTable: 'Faires, Design of Machine Elements, 4th ed., form-factor table (edition from memory)',
	lewis:
		'Lewis bending stress; Shigley, Mechanical Engineering Design, 8th ed., ch. 14 (edition from memory)',
	generatedTooth: 'Lewis parabola on the generated tooth; as in the AGMA 225 tables (from memory)',
	generatedFlank: 'definition; Litvin, Gear Geometry and Applied Theory (from memory)',
	stressConcentration: 'Dolan and Broghamer (1942); AGMA 908-B89 (from memory)',
	hertz:
		'contact stress by Hertz; Shigley, Mechanical Engineering Design, 8th ed., sec. 14-2 (edition from memory)',
	buckingham:
		"Buckingham's limit load for wear; Buckingham, Analytical Mechanics of Gears (edition from memory)",
	mesh: 'involute geometry; Shigley, Mechanical Engineering Design, 8th ed., ch. 13 (edition from memory)',
	span: 'span over teeth; ISO/TR 10064-2; DIN 3960 (from memory)',
	overPins: "measurement over wires; Machinery's Handbook (from memory)",
	definition: 'definition',
	commonPractice: 'common practice',
	plantRule: 'rule of the plant',
	propagation: 'first-order propagation; JCGM 100:2008, 5.1.2; 95 % one-sided, normal distribution',
	reliability:
		'first-order reliability; Hasofer and Lind (1974) (from memory); 95 % one-sided, normal distribution'
} as const;
