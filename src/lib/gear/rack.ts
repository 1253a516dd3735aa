/**
 * The basic rack that generates a tooth: the straight-sided tool profile of a form, in modules. Every figure about a
 * tooth's shape (strength, measuring, mesh, drawing) starts from one of these.
 */
import type { ToothForm } from './contract';

/** Addendum ha, dedendum hf and tip radius rho of the cutting rack in modules; pressure angle in radians. */
export interface BasicRack {
	addendum: number;
	dedendum: number;
	tipRadius: number;
	pressureAngle: number;
}

/** Below this angle (radians) full depth teeth are of the older kind, with the shallower dedendum. */
const NEWER_ANGLE = (19.5 * Math.PI) / 180;

/**
 * The rack of a form at a pressure angle in radians.
 * Full depth: below 20 degrees dedendum 1.157 with the largest tip radius that its clearance allows (14.5 degree
 * system, ANSI B6.1: fillet 0.209), from 20 degrees dedendum 1.25 and tip radius 0.3 (ANSI B6.1-1968 coarse pitch;
 * ISO 53:1998 profile B). Stub: 0.8 and 1.0 with tip radius 0.304 at 20 degrees (AGMA 201.02A). All from memory.
 * @example rackOf('stub', Math.PI / 9).tipRadius // 0.30396
 * @example rackOf('full-depth', (14.5 * Math.PI) / 180).tipRadius // 0.209546
 */
export function rackOf(form: ToothForm, pressureAngle: number): BasicRack {
	if (typeof form === 'object') return { ...form, pressureAngle };
	if (form === 'stub') return fitted(0.8, 1, pressureAngle);
	if (pressureAngle < NEWER_ANGLE) return fitted(1, OLDER_DEDENDUM, pressureAngle);
	return { addendum: 1, dedendum: 1.25, tipRadius: 0.3, pressureAngle };
}

/** 1 + π/20: a clearance of a twentieth of the circular pitch. */
const OLDER_DEDENDUM = 1 + Math.PI / 20;

/** The tip is rounded as far as it can be while the flank stays straight for the addendum's depth. */
function fitted(addendum: number, dedendum: number, pressureAngle: number): BasicRack {
	const tipRadius = (dedendum - addendum) / (1 - Math.sin(pressureAngle));
	return { addendum, dedendum, tipRadius, pressureAngle };
}

/**
 * Depth below the reference line, in modules, to which the rack's flank is straight. hs = hf - rho (1 - sin α).
 * @example straightDepth(rackOf('full-depth', (14.5 * Math.PI) / 180)) // 1
 */
export function straightDepth({ dedendum, tipRadius, pressureAngle }: BasicRack): number {
	return dedendum - tipRadius * (1 - Math.sin(pressureAngle));
}

/**
 * Largest tip radius, in modules, for which the rack's tip still has a land.
 * rho = (π / 4 - hf tan α) cos α / (1 - sin α). Source: geometry (definition).
 * @example largestTipRadius(rackOf('full-depth', Math.PI / 9)) // 0.47191
 */
export function largestTipRadius({ dedendum, pressureAngle }: BasicRack): number {
	const halfLand = Math.PI / 4 - dedendum * Math.tan(pressureAngle);
	return (halfLand * Math.cos(pressureAngle)) / (1 - Math.sin(pressureAngle));
}
