/** A matched screen counts for that screen only: zoom, resolution and another screen undo it at once. */
import { beforeEach, describe, expect, test } from 'vitest';
import { Calibration, KEY, START, stepped, type ScreenWindow } from '$lib/features/strip/calibration.svelte';

class FakeScreen extends EventTarget {
	devicePixelRatio = 2;
	screen = { width: 1280, height: 800 };
	visualViewport = Object.assign(new EventTarget(), { scale: 1 });
	/** The resolution queries that somebody listens to. */
	queries = new Map<string, EventTarget>();
	kept = new Map<string, string>();
	full = false;
	localStorage = {
		getItem: (key: string) => this.kept.get(key) ?? null,
		setItem: (key: string, value: string) => {
			if (this.full) throw new DOMException('full', 'QuotaExceededError');
			this.kept.set(key, value);
		}
	};
	/** What is called at intervals. */
	timers = new Map<number, () => void>();
	setInterval(look: () => void): number {
		this.timers.set(this.timers.size, look);
		return this.timers.size - 1;
	}
	clearInterval(timer: number): void {
		this.timers.delete(timer);
	}
	matchMedia(query: string): EventTarget {
		const target = new EventTarget();
		this.queries.set(query, target);
		return target;
	}
}

const NOON = new Date('2026-03-04T12:00:00.000Z');
let screen: FakeScreen;
const open = () => new Calibration(screen as unknown as ScreenWindow, () => NOON);
const why = ({ standing }: Calibration) => (standing.valid ? 'valid' : standing.why);

beforeEach(() => (screen = new FakeScreen()));

test('nobody has matched this screen', () => {
	expect(open().standing).toEqual({ valid: false, why: 'never' });
});

test('what was matched is kept on the device with the screen it was matched on', () => {
	expect(open().keep(6)).toBe(true);
	expect(JSON.parse(screen.kept.get(KEY)!)).toEqual({
		pxPerMm: 6,
		devicePixelRatio: 2,
		screenWidth: 1280,
		screenHeight: 800,
		date: NOON.toISOString()
	});
	expect(open().standing).toEqual({ valid: true, pxPerMm: 6, date: NOON.toISOString() });
});

test.each(['nonsense', '{}', '{"pxPerMm":-1}', '"6"'])(
	'what is kept but is no scale counts for nothing: %s',
	(text) => {
		screen.kept.set(KEY, text);
		expect(open().standing).toEqual({ valid: false, why: 'never' });
	}
);

test('a device that stores nothing still holds the scale, and says so', () => {
	screen.full = true;
	const calibration = open();
	expect(calibration.keep(6)).toBe(true);
	expect(calibration.standing.valid).toBe(true);
	expect(calibration.remembered).toBe(false);
});

describe('it stops counting', () => {
	let calibration: Calibration;
	let stop: () => void;
	beforeEach(() => {
		calibration = open();
		calibration.keep(6);
		stop = calibration.watch();
	});

	test('when the resolution changes, told by the query of the resolution alone', () => {
		screen.devicePixelRatio = 3;
		screen.queries.get('(resolution: 2dppx)')!.dispatchEvent(new Event('change'));
		expect(why(calibration)).toBe('resolution');
		// The next change is told by a query for the new resolution.
		screen.devicePixelRatio = 2;
		screen.queries.get('(resolution: 3dppx)')!.dispatchEvent(new Event('change'));
		expect(why(calibration)).toBe('valid');
	});

	test('when the page is zoomed, told by resize', () => {
		screen.devicePixelRatio = 2.2;
		screen.dispatchEvent(new Event('resize'));
		expect(why(calibration)).toBe('resolution');
	});

	test('while two fingers enlarge it, and cannot be matched then', () => {
		screen.visualViewport.scale = 1.5;
		screen.visualViewport.dispatchEvent(new Event('resize'));
		expect(why(calibration)).toBe('pinched');
		expect(calibration.keep(7)).toBe(false);
		screen.visualViewport.scale = 1;
		screen.visualViewport.dispatchEvent(new Event('resize'));
		expect(calibration.standing).toMatchObject({ valid: true, pxPerMm: 6 });
	});

	test('on another screen; turning the same one changes nothing', () => {
		screen.screen = { width: 800, height: 1280 };
		screen.dispatchEvent(new Event('resize'));
		expect(why(calibration)).toBe('valid');
		screen.screen = { width: 1920, height: 1080 };
		screen.dispatchEvent(new Event('resize'));
		expect(why(calibration)).toBe('screen');
	});

	test('on another screen of the same resolution, which no event tells', () => {
		screen.screen = { width: 1920, height: 1080 };
		for (const look of screen.timers.values()) look();
		expect(why(calibration)).toBe('screen');
	});

	test('also when it changed while the page was closed', () => {
		screen.devicePixelRatio = 1;
		expect(why(open())).toBe('resolution');
	});

	test('and listens no longer once it is stopped', () => {
		stop();
		screen.devicePixelRatio = 3;
		screen.dispatchEvent(new Event('resize'));
		expect(why(calibration)).toBe('valid');
		expect(screen.timers.size).toBe(0);
	});
});

describe('the steps', () => {
	test('start from 96 pixels an inch and land on whole steps', () => {
		expect(START).toBeCloseTo(3.7795, 4);
		expect(stepped(START, 1, 'fine')).toBe(3.78);
		expect(stepped(START, -1, 'fine')).toBe(3.77);
		expect(stepped(START, 1, 'coarse')).toBe(3.8);
		expect(stepped(START, -1, 'coarse')).toBe(3.7);
	});

	test('reach any hundredth and come back', () => {
		let scale = START;
		for (let i = 0; i < 23; i++) scale = stepped(scale, 1, 'coarse');
		expect(scale).toBe(6);
		for (let i = 0; i < 7; i++) scale = stepped(scale, 1, 'fine');
		expect(scale).toBe(6.07);
		for (let i = 0; i < 7; i++) scale = stepped(scale, -1, 'fine');
		expect(scale).toBe(6);
	});

	test('end where no screen is', () => {
		expect(stepped(15, 1, 'coarse')).toBe(15);
		expect(stepped(2, -1, 'fine')).toBe(2);
	});
});
