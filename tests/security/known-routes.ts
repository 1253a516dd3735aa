/**
 * Every server route and method there is, who may use it, and how it is asked with things of a given plant.
 * Whoever adds a route adds it here: the matrix fails on one that it does not know.
 */
import type { Role } from '$lib/records/protocol';
import { typedFrom } from '$lib/features/materials/statement-form';
import { testMaterial, type TestPlant } from '../server/fixtures/plant';
import { makeRecord, makeTablet, pushOf } from '../server/fixtures/record';
import { formInit, jsonInit, type Asked } from '../server/fixtures/request';

/** A plant with something in it that a request can name. */
export interface Target {
	plant: TestPlant;
	checkId: string;
}

export interface KnownRoute {
	/** `anyone` also without a session; `person` with a session, wherever they work; otherwise these roles. */
	who: 'anyone' | 'person' | 'member' | readonly Role[];
	/** The answer to those who may, for things of their own plant. */
	status: readonly number[];
	/** Present when a request names things of a plant; the answer for things of another plant. */
	foreign?: number;
	asked?(of: Target): Partial<Asked> | Promise<Partial<Asked>>;
}

const OFFICE = ['planner', 'supervisor'] as const;

export const KNOWN_ROUTES: Record<string, KnownRoute> = {
	'load /': { who: 'anyone', status: [303] },
	'GET /health': { who: 'anyone', status: [200] },

	'load /(door)': { who: 'anyone', status: [200] },
	'load /(door)/sign-in': { who: 'anyone', status: [200, 303] },
	'action default /(door)/sign-in': {
		who: 'anyone',
		status: [400],
		asked: () => ({ init: formInit({ email: 'nobody@nowhere.example', password: 'a wrong password' }) })
	},
	'POST /(door)/sign-out': { who: 'anyone', status: [303], asked: () => ({ init: formInit({}) }) },
	'POST /(door)/language': {
		who: 'anyone',
		status: [303],
		asked: () => ({ init: formInit({ language: 'es' }) })
	},
	'POST /(door)/work-at': {
		who: 'person',
		status: [303],
		foreign: 404,
		asked: ({ plant }) => ({ init: formInit({ plant: plant.id }) })
	},

	'GET /api/v1/me': { who: 'person', status: [200] },
	'GET /api/v1/pull': { who: 'member', status: [200] },
	'POST /api/v1/push': {
		who: 'member',
		status: [200],
		// Each record has its own answer; one of another plant is put off and leaves no trace.
		foreign: 200,
		asked: async ({ plant }) => {
			const tablet = makeTablet();
			return { init: jsonInit(pushOf(tablet, [await makeRecord(plant, tablet)])) };
		}
	},
	'POST /api/v1/evaluate': { who: 'member', status: [422], asked: () => ({ init: jsonInit({}) }) },
	'POST /api/v1/identify': { who: 'member', status: [422], asked: () => ({ init: jsonInit({}) }) },

	'GET /api/v1/recompute': { who: OFFICE, status: [200] },

	'load /(office)': { who: OFFICE, status: [200] },
	'load /(office)/machines': { who: OFFICE, status: [200] },
	'load /(office)/machines/[machine]': {
		who: OFFICE,
		status: [200],
		foreign: 404,
		asked: ({ plant }) => ({ params: { machine: plant.machineIds[0]! } })
	},
	'load /(office)/checks': { who: OFFICE, status: [200] },
	'load /(office)/checks/[check]': {
		who: OFFICE,
		status: [200],
		foreign: 404,
		asked: ({ checkId }) => ({ params: { check: checkId } })
	},
	'load /(office)/materials': { who: OFFICE, status: [200] },
	'load /(office)/materials/[material]': {
		who: OFFICE,
		status: [200],
		foreign: 404,
		asked: ({ plant }) => ({ params: { material: plant.materialId } })
	},
	'action default /(office)/materials/[material]': {
		who: ['supervisor'],
		status: [303],
		foreign: 404,
		asked: ({ plant }) => ({
			params: { material: plant.materialId },
			init: formInit({ ...typedFrom(testMaterial('Revised')), expectedRevision: '1' })
		})
	},
	'load /(office)/rules': { who: OFFICE, status: [200] },
	'action tools /(office)/rules': {
		who: ['supervisor'],
		status: [303],
		asked: () => ({ init: formInit({ expectedRevision: '1', calliper: '0.06' }) })
	},
	'load /(office)/materials/new': { who: ['supervisor'], status: [200] },
	'action default /(office)/materials/new': {
		who: ['supervisor'],
		status: [303],
		asked: () => ({ init: formInit(typedFrom(testMaterial('Added'))) })
	}
};
