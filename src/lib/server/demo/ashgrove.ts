/** Ashgrove Board Mill: an old line with inch gears by diametral pitch. Invented, as is every figure of it. */
import { ASHGROVE_MACHINES } from './ashgrove-machines';
import { ASHGROVE_MATERIALS } from './ashgrove-materials';
import { HOLLIS, person } from './people';
import { DEMO_SERVICE_FACTORS, type DemoPlant } from './scenario';

export const ASHGROVE: DemoPlant = {
	name: 'Ashgrove Board Mill',
	origin: 'inch',
	people: [
		{ person: person('millwright@ashgrove.example', 'Bexley', 'paper-tag-brass-eyelet'), role: 'millwright' },
		{ person: person('planner@ashgrove.example', 'Corrin', 'index-card-long-drawer'), role: 'planner' },
		{ person: person('supervisor@ashgrove.example', 'Arden', 'ink-stamp-green-enamel'), role: 'supervisor' },
		{ person: HOLLIS, role: 'planner' }
	],
	authors: ['millwright@ashgrove.example', 'supervisor@ashgrove.example'],
	rules: {
		bendingMargin: 1.5,
		wearMargin: 1.2,
		reversingFactor: 0.7,
		cutLaw: 1200,
		formFactor: 'handbook',
		speedLimit: { cast: null, cut: null, hobbed: null, ground: null },
		uncertainty: { faceWidth: 0.01, load: 0.08, speed: 0.01 },
		serviceFactors: DEMO_SERVICE_FACTORS
	},
	materials: ASHGROVE_MATERIALS,
	machines: ASHGROVE_MACHINES,
	lost: { after: 8, count: 2 },
	waiting: 3
};
