/** Machines of Ashgrove Board Mill: gears by diametral pitch, with the checks of a year. All invented. */
import { check, dp, type DemoMachine } from './scenario';

export const ASHGROVE_MACHINES: DemoMachine[] = [
	{
		tag: 'A-204',
		name: 'Reject tank stirrer',
		area: 'Stock preparation',
		positions: [
			{
				name: 'Stage 1 pinion',
				mateTeeth: 54,
				gear: {
					teeth: 18,
					pitch: dp(4),
					angle: 14.5,
					form: 'full-depth',
					face: 2.5,
					finish: 'cut',
					material: 'iron-30'
				},
				drive: { power: 10, rpm: 220, duty: 'light-shock' },
				checks: [check(301, 'iron-40', 0), check(122, 's1040', 1), check(2.1, 'iron-30', 0)]
			},
			{
				name: 'Stage 2 gear',
				mateTeeth: 20,
				gear: {
					teeth: 60,
					pitch: dp(3),
					angle: 14.5,
					form: 'full-depth',
					face: 3.5,
					finish: 'cut',
					material: 's1040'
				},
				drive: { power: 10, rpm: 73, duty: 'light-shock' },
				checks: [check(287, 's1040', 0), check(180, 's1040', 1), check(58, 's1045', 0)]
			}
		]
	},
	{
		tag: 'A-131',
		name: 'Broke pulper drive',
		area: 'Stock preparation',
		positions: [
			{
				name: 'Intermediate gear',
				mateTeeth: 21,
				gear: {
					teeth: 42,
					pitch: dp(3),
					angle: 20,
					form: 'full-depth',
					face: 4,
					finish: 'cut',
					material: 'iron-30'
				},
				drive: { power: 40, rpm: 175, duty: 'medium-shock' },
				checks: [check(340, 's1045', 1), check(199, 's4140', 1), check(0.4, 'iron-30', 1)]
			},
			{
				name: 'Motor pinion',
				mateTeeth: 63,
				gear: {
					teeth: 21,
					pitch: dp(4),
					angle: 20,
					form: 'full-depth',
					face: 3,
					finish: 'hobbed',
					material: 's4140'
				},
				drive: { power: 40, rpm: 525, duty: 'medium-shock' },
				checks: [check(339, 's1045', 1), check(198, 's4140', 1), check(61, 's4140', 0)]
			}
		]
	},
	{
		tag: 'A-118',
		name: 'Wire return turner',
		area: 'Wet end',
		positions: [
			{
				name: 'Idler',
				mateTeeth: 36,
				gear: {
					teeth: 27,
					pitch: dp(8),
					angle: 20,
					form: 'full-depth',
					face: 1.25,
					finish: 'hobbed',
					material: 'nylon'
				},
				drive: { power: 0.25, rpm: 150, duty: 'uniform', reversing: true },
				checks: [check(281, 'nylon', 0), check(150, 'phenolic', 0), check(3.2, 'nylon', 0)]
			}
		]
	},
	{
		tag: 'A-117',
		name: 'Couch pit agitator',
		area: 'Wet end',
		positions: [
			{
				name: 'Stage 1 pinion',
				mateTeeth: 72,
				gear: {
					teeth: 18,
					pitch: dp(6),
					angle: 20,
					form: 'full-depth',
					face: 1.75,
					finish: 'hobbed',
					material: 's4140'
				},
				drive: { power: 7.5, rpm: 870, duty: 'light-shock' },
				checks: [check(330, 's1045', 0), check(199, 's4140', 0), check(88, 's4140', 1)]
			},
			{
				name: 'Stage 2 pinion',
				mateTeeth: 60,
				gear: {
					teeth: 25,
					pitch: dp(5),
					angle: 20,
					form: 'full-depth',
					face: 1.9375,
					finish: 'cut',
					material: 's4140'
				},
				drive: { power: 15, rpm: 217, duty: 'medium-shock' },
				checks: [check(310, 's1045', 0), check(166, 's4140', 0), check(1.1, 's4140', 1)]
			}
		]
	},
	{
		tag: 'A-142',
		name: 'Size press feed',
		area: 'Dry end',
		positions: [
			{
				name: 'Stage 3 gear',
				mateTeeth: 19,
				gear: {
					teeth: 56,
					pitch: dp(6),
					angle: 20,
					form: 'full-depth',
					face: 0.875,
					finish: 'cut',
					material: 's1040'
				},
				drive: { power: 5, rpm: 96, duty: 'uniform' },
				checks: [check(255, 's1045', 1), check(140, 's1040', 1), check(4.3, 's1040', 1)]
			},
			{
				name: 'Stage 3 pinion',
				mateTeeth: 56,
				gear: {
					teeth: 19,
					pitch: dp(6),
					angle: 20,
					form: 'full-depth',
					face: 1.5,
					finish: 'cut',
					material: 's4140'
				},
				drive: { power: 5, rpm: 283, duty: 'uniform' },
				checks: [check(254, 's4140', 1), check(160, 's4140', 1), check(35, 's4140', 0)]
			}
		]
	},
	{
		tag: 'A-150',
		name: 'Felt stretcher',
		area: 'Wet end',
		positions: [
			{
				name: 'Take-up pinion',
				mateTeeth: 45,
				gear: {
					teeth: 15,
					pitch: dp(4),
					angle: 20,
					form: 'stub',
					face: 2,
					finish: 'cast',
					material: 's1045'
				},
				drive: { power: 1, rpm: 24, duty: 'light-shock', reversing: true },
				checks: [check(360, 's1045', 0), check(210, 's4140', 0), check(9.2, 's1045', 0)]
			}
		]
	},
	{
		tag: 'A-126',
		name: 'Starch kettle stirrer',
		area: 'Coating kitchen',
		positions: [
			{
				name: 'Slow gear',
				mateTeeth: 22,
				gear: {
					teeth: 88,
					pitch: dp(5),
					angle: 14.5,
					form: 'full-depth',
					face: 2,
					finish: 'cut',
					material: 'iron-40'
				},
				drive: { power: null, rpm: 31, duty: 'light-shock' },
				checks: [
					check(244, 'iron-40', 1, { power: 3 }),
					check(120, 'iron-40', 0, { power: 3 }),
					check(6.4, 'iron-40', 1, { unknown: 'load' })
				]
			},
			{
				name: 'Fast pinion',
				mateTeeth: 66,
				gear: {
					teeth: 17,
					pitch: dp(8),
					angle: 14.5,
					form: 'full-depth',
					face: 1.25,
					finish: 'hobbed',
					material: 's1045'
				},
				drive: { power: 3, rpm: 580, duty: 'light-shock' },
				checks: [check(243, 's1040', 1), check(161, 's1045', 0), check(77, 's1045', 1)]
			}
		]
	},
	{
		tag: 'A-160',
		name: 'Sheet stacker table',
		area: 'Finishing',
		positions: [
			{
				name: 'Lift pinion',
				mateTeeth: null,
				gear: {
					teeth: 20,
					pitch: dp(6),
					angle: 20,
					form: 'full-depth',
					face: 2,
					finish: 'cut',
					material: 's1045'
				},
				drive: { power: 2, rpm: 90, duty: 'medium-shock', reversing: true },
				checks: [check(180, 's4140', 0), check(95, 's1045', 0), check(11.3, 's1045', 0, { unknown: 'face' })]
			}
		]
	},
	{
		tag: 'A-109',
		name: 'Trim winder drive',
		area: 'Finishing',
		positions: [
			{
				name: 'Stage 1 gear',
				mateTeeth: 16,
				gear: {
					teeth: 64,
					pitch: dp(5),
					angle: 20,
					form: 'full-depth',
					face: 2.5,
					finish: 'cut',
					material: 's1045'
				},
				drive: { power: 10, rpm: 145, duty: 'light-shock' },
				checks: [check(320, 's1040', 0), check(131, 's1045', 1), check(14.2, 's1045', 1)]
			},
			{
				name: 'Stage 1 pinion',
				mateTeeth: 64,
				gear: {
					teeth: 16,
					pitch: dp(5),
					angle: 20,
					form: 'full-depth',
					face: 2.5,
					finish: 'hobbed',
					material: 's4140'
				},
				drive: { power: 10, rpm: 580, duty: 'light-shock' },
				checks: [check(319, 's4140', 0), check(224, 's1045', 1), check(130, 's4140', 0)]
			},
			{
				name: 'Brake hub gear',
				mateTeeth: 24,
				gear: {
					teeth: 48,
					pitch: dp(6),
					angle: 20,
					form: 'full-depth',
					face: 1.5,
					finish: 'cut',
					material: 's1040'
				},
				drive: { power: 3, rpm: 190, duty: 'heavy-shock' },
				checks: [check(275, 's1040', 1), check(150, 's1040', 1), check(21.5, 's1045', 0)]
			}
		]
	},
	{
		tag: 'A-181',
		name: 'Bale press table',
		area: 'Yard',
		positions: [
			{ name: 'Feed pinion', mateTeeth: null, gear: null, drive: null, checks: [] },
			{
				name: 'Feed gear',
				mateTeeth: null,
				gear: null,
				drive: { power: 7.5, rpm: 60, duty: 'heavy-shock' },
				checks: []
			}
		]
	}
];
