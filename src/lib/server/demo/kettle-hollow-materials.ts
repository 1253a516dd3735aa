/** Materials on Kettle Hollow's list: other allowables than Ashgrove's for the same metals, by its own choice. */
import type { DemoMaterial } from './scenario';

const MPa = (value: number) => ({ value, unit: 'MPa' }) as const;
const GPa = (value: number) => ({ value, unit: 'GPa' }) as const;
const steel = { metallic: true, modulus: GPa(206), poisson: 0.3, permitted: true } as const;
const iron = { metallic: true, poisson: 0.26, permitted: true } as const;
const BASIS = 'yield strength divided by three';

export const KETTLE_HOLLOW_MATERIALS: DemoMaterial[] = [
	{
		key: 'gg25',
		statement: {
			name: 'Grey iron 250',
			condition: 'as cast',
			allowableBending: MPa(58),
			basis: 'tensile strength divided by four',
			brinellLow: 180,
			brinellHigh: 230,
			modulus: GPa(110),
			...iron
		}
	},
	{
		key: 'ggg50',
		statement: {
			name: 'Ductile iron 500',
			condition: 'as cast',
			allowableBending: MPa(105),
			basis: BASIS,
			brinellLow: 170,
			brinellHigh: 230,
			modulus: GPa(169),
			...iron
		},
		revisions: [[230, { allowableBending: MPa(110) }]]
	},
	{
		key: 'c45',
		statement: {
			name: 'Steel 1045 (C45)',
			condition: 'normalised',
			allowableBending: MPa(140),
			basis: BASIS,
			brinellLow: 170,
			brinellHigh: 210,
			...steel
		}
	},
	{
		key: '42crmo4',
		statement: {
			name: 'Steel 4140 (42CrMo4)',
			condition: 'quenched and tempered',
			allowableBending: MPa(240),
			basis: BASIS,
			brinellLow: 260,
			brinellHigh: 310,
			...steel
		}
	},
	{
		key: 'bronze',
		statement: {
			name: 'Tin bronze',
			condition: 'centrifugally cast',
			metallic: true,
			allowableBending: MPa(70),
			basis: BASIS,
			brinellLow: 80,
			brinellHigh: 110,
			modulus: GPa(105),
			poisson: 0.34,
			permitted: true
		}
	},
	{
		key: 'nylon',
		statement: {
			name: 'Moulded nylon',
			condition: 'conditioned',
			metallic: false,
			allowableBending: MPa(30),
			basis: 'value of the moulder, halved',
			brinellLow: null,
			brinellHigh: null,
			modulus: GPa(2.6),
			poisson: null,
			permitted: false
		}
	}
];
