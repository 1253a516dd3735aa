/** Kettle Hollow Lime Works: metric gears by module. Invented, as is every figure of it. */
import { KETTLE_HOLLOW_MACHINES } from './kettle-hollow-machines';
import { KETTLE_HOLLOW_MATERIALS } from './kettle-hollow-materials';
import { HOLLIS, person } from './people';
import { DEMO_SERVICE_FACTORS, type DemoPlant } from './scenario';

export const KETTLE_HOLLOW: DemoPlant = {
	name: 'Kettle Hollow Lime Works',
	origin: 'metric',
	people: [
		{
			person: person('millwright@kettlehollow.example', 'Dunmore', 'kiln-brick-steel-rule'),
			role: 'millwright'
		},
		{ person: person('planner@kettlehollow.example', 'Ellery', 'white-dust-blue-pencil'), role: 'planner' },
		{
			person: person('supervisor@kettlehollow.example', 'Farrow', 'lime-burner-third-shift', 'es'),
			role: 'supervisor'
		},
		{ person: HOLLIS, role: 'millwright' }
	],
	authors: ['millwright@kettlehollow.example', 'hollis@ashgrove.example'],
	rules: {
		bendingMargin: 1.4,
		wearMargin: 1.2,
		reversingFactor: 0.7,
		cutLaw: 600,
		formFactor: 'handbook',
		speedLimit: { cast: { value: 2, unit: 'm/s' }, cut: null, hobbed: null, ground: null },
		uncertainty: { faceWidth: 0.01, load: 0.08, speed: 0.01 },
		serviceFactors: DEMO_SERVICE_FACTORS
	},
	materials: KETTLE_HOLLOW_MATERIALS,
	machines: KETTLE_HOLLOW_MACHINES,
	lost: { after: 2, count: 1 },
	waiting: 1
};
