/** Machines of Kettle Hollow Lime Works: gears by module, with the checks of a year. All invented. */
import { check, module, type DemoMachine } from './scenario';

export const KETTLE_HOLLOW_MACHINES: DemoMachine[] = [
	{
		tag: 'K-03',
		name: 'Stone feeder',
		area: 'Quarry side',
		positions: [
			{
				name: 'Drum gear',
				mateTeeth: 19,
				gear: {
					teeth: 76,
					pitch: module(8),
					angle: 20,
					form: 'full-depth',
					face: 80,
					finish: 'cut',
					material: 'gg25'
				},
				drive: { power: 11, rpm: 36, duty: 'heavy-shock' },
				checks: [check(333, 'ggg50', 0), check(171, 'ggg50', 0), check(5.2, 'gg25', 0)]
			},
			{
				name: 'Drum pinion',
				mateTeeth: 76,
				gear: {
					teeth: 19,
					pitch: module(8),
					angle: 20,
					form: 'full-depth',
					face: 85,
					finish: 'cut',
					material: 'c45'
				},
				drive: { power: 11, rpm: 145, duty: 'heavy-shock' },
				checks: [check(332, 'c45', 0), check(190, '42crmo4', 0), check(40, '42crmo4', 1)]
			}
		]
	},
	{
		tag: 'K-07',
		name: 'Kiln charging gate',
		area: 'Kiln',
		positions: [
			{
				name: 'Gate gear',
				mateTeeth: 18,
				gear: {
					teeth: 90,
					pitch: module(6),
					angle: 20,
					form: 'full-depth',
					face: 60,
					finish: 'cut',
					material: 'c45'
				},
				drive: { power: 7.5, rpm: 48, duty: 'medium-shock', reversing: true },
				checks: [check(300, 'c45', 1), check(120, 'c45', 1), check(12.6, 'c45', 1, { unknown: 'speed' })]
			},
			{
				name: 'Gate pinion',
				mateTeeth: 90,
				gear: {
					teeth: 18,
					pitch: module(6),
					angle: 20,
					form: 'full-depth',
					face: 65,
					finish: 'hobbed',
					material: '42crmo4'
				},
				drive: { power: 7.5, rpm: 240, duty: 'medium-shock', reversing: true },
				checks: [check(299, '42crmo4', 1), check(101, '42crmo4', 0), check(20, '42crmo4', 1)]
			}
		]
	},
	{
		tag: 'K-12',
		name: 'Hydrator mixer',
		area: 'Hydration',
		positions: [
			{
				name: 'Shaft gear 1',
				mateTeeth: 40,
				gear: {
					teeth: 40,
					pitch: module(5),
					angle: 20,
					form: 'full-depth',
					face: 60,
					finish: 'cut',
					material: 'ggg50'
				},
				drive: { power: 5.5, rpm: 110, duty: 'light-shock' },
				checks: [check(271, 'ggg50', 0), check(133, 'ggg50', 0), check(7.3, 'ggg50', 0)]
			},
			{
				name: 'Shaft gear 2',
				mateTeeth: 40,
				gear: {
					teeth: 40,
					pitch: module(5),
					angle: 20,
					form: 'full-depth',
					face: 50,
					finish: 'cut',
					material: 'nylon'
				},
				drive: { power: 4, rpm: 110, duty: 'light-shock' },
				checks: [check(270, 'ggg50', 0), check(140, 'ggg50', 1), check(8.4, 'nylon', 0)]
			}
		]
	},
	{
		tag: 'K-15',
		name: 'Cooler discharge grate',
		area: 'Kiln',
		positions: [
			{
				name: 'Stage 2 pinion',
				mateTeeth: 57,
				gear: {
					teeth: 17,
					pitch: module(7),
					angle: 20,
					form: 'stub',
					face: 70,
					finish: 'cut',
					material: 'c45'
				},
				drive: { power: 3, rpm: 62, duty: 'heavy-shock' },
				checks: [check(222, 'c45', 1), check(110, '42crmo4', 0), check(17.4, 'c45', 1)]
			},
			{
				name: 'Stage 2 gear',
				mateTeeth: 17,
				gear: {
					teeth: 57,
					pitch: module(7),
					angle: 20,
					form: 'stub',
					face: 70,
					finish: 'cut',
					material: 'ggg50'
				},
				drive: { power: 3, rpm: 18.5, duty: 'heavy-shock' },
				checks: [check(221, 'ggg50', 1), check(112, 'ggg50', 0), check(33, 'c45', 1)]
			}
		]
	},
	{
		tag: 'K-21',
		name: 'Bag conveyor',
		area: 'Packing',
		positions: [
			{
				name: 'Head gear',
				mateTeeth: 20,
				gear: {
					teeth: 50,
					pitch: module(4),
					angle: 20,
					form: 'full-depth',
					face: 40,
					finish: 'hobbed',
					material: 'c45'
				},
				drive: { power: 2.2, rpm: 120, duty: 'uniform' },
				checks: [check(188, 'c45', 0), check(99, 'c45', 1), check(28, 'bronze', 0)]
			},
			{
				name: 'Tail gear',
				mateTeeth: 20,
				gear: {
					teeth: 50,
					pitch: module(4),
					angle: 20,
					form: 'full-depth',
					face: 40,
					finish: 'hobbed',
					material: 'c45'
				},
				drive: { power: 2.2, rpm: 120, duty: 'uniform' },
				checks: [check(187, 'c45', 0), check(66, 'bronze', 0)]
			}
		]
	},
	{
		tag: 'K-26',
		name: 'Bucket elevator',
		area: 'Packing',
		positions: [
			{
				name: 'Motor pinion',
				mateTeeth: 68,
				gear: {
					teeth: 20,
					pitch: module(3),
					angle: 20,
					form: 'full-depth',
					face: 40,
					finish: 'ground',
					material: '42crmo4'
				},
				drive: { power: 5.5, rpm: 960, duty: 'light-shock' },
				checks: [check(158, '42crmo4', 0), check(80, 'c45', 0), check(19.5, '42crmo4', 1)]
			},
			{ name: 'Slow gear', mateTeeth: null, gear: null, drive: null, checks: [] }
		]
	}
];
