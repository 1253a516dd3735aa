/**
 * How many CSS pixels a millimetre has on this screen, as a person matched it to a bank card. It holds for the screen,
 * zoom and resolution it was made with and for no other: as soon as one differs, it is not used.
 */
import { z } from 'zod';

/** What a scale depends on. */
export interface ScreenNow {
	devicePixelRatio: number;
	screenWidth: number;
	screenHeight: number;
	/** Of two fingers; 1 when the page is not enlarged. */
	pinch: number;
}

const keptSchema = z.object({
	pxPerMm: z.number().positive(),
	devicePixelRatio: z.number().positive(),
	screenWidth: z.number().positive(),
	screenHeight: z.number().positive(),
	date: z.iso.datetime()
});
export type KeptScale = z.infer<typeof keptSchema>;

export type WhyNot = 'never' | 'pinched' | 'resolution' | 'screen';
export type Standing = { valid: true; pxPerMm: number; date: string } | { valid: false; why: WhyNot };

/** Of the window, what is needed here. */
export interface ScreenWindow extends Pick<Window, 'devicePixelRatio' | 'addEventListener'> {
	removeEventListener: Window['removeEventListener'];
	setInterval(look: () => void, ms: number): number;
	clearInterval(timer: number): void;
	screen: Pick<Screen, 'width' | 'height'>;
	visualViewport: (EventTarget & Pick<VisualViewport, 'scale'>) | null;
	matchMedia(query: string): EventTarget;
	localStorage: Pick<Storage, 'getItem' | 'setItem'>;
}

/** ISO/IEC 7810 ID-1, mm; the corner's radius from memory. */
export const CARD = { width: 85.6, height: 53.98, corner: 3.18 } as const;
/** A CSS pixel is a 96th of an inch where nobody has measured. */
export const START = 96 / 25.4;
export const KEY = 'cogmark-strip';

/** px/mm: from a wall screen to a phone with everything set small. */
const LEAST = 2;
const MOST = 15;
const COARSE = 0.1;
const FINE = 0.01;
/** ms. */
const LOOK_AGAIN = 500;

/** The next scale on the grid of the coarse or fine step, px/mm. */
export function stepped(pxPerMm: number, way: 1 | -1, size: 'coarse' | 'fine'): number {
	const step = size === 'coarse' ? COARSE : FINE;
	const at = Number((pxPerMm / step).toFixed(6));
	const next = way > 0 ? Math.floor(at) + 1 : Math.ceil(at) - 1;
	return Math.min(MOST, Math.max(LEAST, Number((next * step).toFixed(2))));
}

/** Turning the tablet swaps the sides of its screen and changes no millimetre. */
export function standing(kept: KeptScale | null, now: ScreenNow): Standing {
	if (now.pinch !== 1) return { valid: false, why: 'pinched' };
	if (!kept) return { valid: false, why: 'never' };
	if (kept.devicePixelRatio !== now.devicePixelRatio) return { valid: false, why: 'resolution' };
	const sides = (one: { screenWidth: number; screenHeight: number }) =>
		[one.screenWidth, one.screenHeight].sort((a, b) => a - b).join(' ');
	if (sides(kept) !== sides(now)) return { valid: false, why: 'screen' };
	return { valid: true, pxPerMm: kept.pxPerMm, date: kept.date };
}

export class Calibration {
	kept: KeptScale | null = $state.raw(null);
	now: ScreenNow = $state.raw({ devicePixelRatio: 1, screenWidth: 0, screenHeight: 0, pinch: 1 });
	/** False when this device would not store it: it then holds until the page is closed. */
	remembered = $state(true);
	#window: ScreenWindow;
	#clock: () => Date;

	constructor(window: ScreenWindow, clock: () => Date = () => new Date()) {
		this.#window = window;
		this.#clock = clock;
		this.now = measured(window);
		this.kept = read(window);
	}

	get standing(): Standing {
		return standing(this.kept, this.now);
	}

	/** Takes a scale for the screen as it is; not while the page is enlarged by two fingers. */
	keep(pxPerMm: number): boolean {
		this.now = measured(this.#window);
		const { devicePixelRatio, screenWidth, screenHeight, pinch } = this.now;
		if (pinch !== 1) return false;
		this.kept = {
			pxPerMm,
			devicePixelRatio,
			screenWidth,
			screenHeight,
			date: this.#clock().toISOString()
		};
		try {
			this.#window.localStorage.setItem(KEY, JSON.stringify(this.kept));
			this.remembered = true;
		} catch {
			this.remembered = false;
		}
		return true;
	}

	/** Looks again whenever the screen may have changed; returns how to stop. */
	watch(): () => void {
		const { visualViewport } = this.#window;
		let resolution: EventTarget | null = null;
		let watched = 0;
		const look = () => {
			const now = measured(this.#window);
			if (JSON.stringify(now) !== JSON.stringify(this.now)) this.now = now;
			if (watched === now.devicePixelRatio) return;
			// The query names the resolution that it watches, so each change asks for a new one.
			watched = now.devicePixelRatio;
			resolution?.removeEventListener('change', look);
			resolution = this.#window.matchMedia(`(resolution: ${watched}dppx)`);
			resolution.addEventListener('change', look);
		};
		look();
		this.#window.addEventListener('resize', look);
		visualViewport?.addEventListener('resize', look);
		// A window that is moved to another screen of the same resolution tells nobody.
		const timer = this.#window.setInterval(look, LOOK_AGAIN);
		return () => {
			this.#window.clearInterval(timer);
			resolution?.removeEventListener('change', look);
			this.#window.removeEventListener('resize', look);
			visualViewport?.removeEventListener('resize', look);
		};
	}
}

function measured({ devicePixelRatio, screen, visualViewport }: ScreenWindow): ScreenNow {
	return {
		devicePixelRatio,
		screenWidth: screen.width,
		screenHeight: screen.height,
		// Browsers leave a rounding behind when fingers have let go.
		pinch: Number((visualViewport?.scale ?? 1).toFixed(3))
	};
}

/** What is not there, or is not a scale, is as if nobody had matched this screen. */
function read({ localStorage }: ScreenWindow): KeptScale | null {
	try {
		const read = keptSchema.safeParse(JSON.parse(localStorage.getItem(KEY) ?? 'null'));
		return read.success ? read.data : null;
	} catch {
		return null;
	}
}
