/** Materials on Ashgrove's list. Allowables are invented; names of grades are those of the trade. */
import type { DemoMaterial } from './scenario';

const steel = {
	metallic: true,
	modulus: { value: 30_000, unit: 'ksi' },
	poisson: 0.3,
	permitted: true
} as const;
const iron = { metallic: true, poisson: 0.25, permitted: true } as const;
const psi = (value: number) => ({ value, unit: 'psi' }) as const;
const ksi = (value: number) => ({ value, unit: 'ksi' }) as const;
const BASIS = 'a third of the ultimate strength, rounded down';

export const ASHGROVE_MATERIALS: DemoMaterial[] = [
	{
		key: 'iron-30',
		statement: {
			name: 'Iron, class 30',
			condition: 'as cast',
			allowableBending: psi(8000),
			basis: BASIS,
			brinellLow: 187,
			brinellHigh: 223,
			modulus: ksi(14_000),
			...iron
		},
		revisions: [
			[292, { allowableBending: psi(8200), brinellLow: 190 }],
			[96, { allowableBending: psi(8500), basis: 'a third of the strength of our own test bars' }]
		]
	},
	{
		key: 'iron-40',
		statement: {
			name: 'Iron, class 40',
			condition: 'as cast',
			allowableBending: psi(12_000),
			basis: BASIS,
			brinellLow: 200,
			brinellHigh: 235,
			modulus: ksi(16_000),
			...iron
		}
	},
	{
		key: 's1040',
		statement: {
			name: 'Steel 1040',
			condition: 'normalised',
			allowableBending: psi(22_000),
			basis: BASIS,
			brinellLow: 160,
			brinellHigh: 190,
			...steel
		}
	},
	{
		key: 's1045',
		statement: {
			name: 'Steel 1045',
			condition: 'hot rolled',
			allowableBending: psi(26_000),
			basis: BASIS,
			brinellLow: 170,
			brinellHigh: 210,
			...steel
		},
		revisions: [[150, { allowableBending: psi(25_000), condition: 'hot rolled or normalised' }]]
	},
	{
		key: 's4140',
		statement: {
			name: 'Steel 4140',
			condition: 'quenched and tempered',
			allowableBending: psi(40_000),
			basis: BASIS,
			brinellLow: 262,
			brinellHigh: 302,
			...steel
		}
	},
	{
		key: 'bronze',
		statement: {
			name: 'Phosphor bronze',
			condition: 'sand cast',
			metallic: true,
			allowableBending: psi(9000),
			basis: BASIS,
			brinellLow: 70,
			brinellHigh: 95,
			modulus: ksi(16_000),
			poisson: 0.34,
			permitted: true
		}
	},
	{
		key: 'phenolic',
		statement: {
			name: 'Laminated phenolic',
			condition: 'cotton fabric',
			metallic: false,
			allowableBending: psi(6000),
			basis: 'value of the sheet supplier, halved',
			brinellLow: null,
			brinellHigh: null,
			modulus: ksi(1000),
			poisson: null,
			permitted: true
		}
	},
	{
		key: 'nylon',
		statement: {
			name: 'Moulded nylon',
			condition: 'dry, as moulded',
			metallic: false,
			allowableBending: psi(5500),
			basis: 'value of the moulder, halved',
			brinellLow: null,
			brinellHigh: null,
			modulus: ksi(400),
			poisson: null,
			permitted: true
		},
		revisions: [[205, { permitted: false, basis: 'withdrawn after teeth softened in the hood' }]]
	},
	{
		key: 'iron-20',
		statement: {
			name: 'Iron, class 20',
			condition: 'as cast',
			allowableBending: psi(5500),
			basis: BASIS,
			brinellLow: 150,
			brinellHigh: 180,
			modulus: ksi(10_000),
			...iron,
			permitted: false
		}
	}
];
