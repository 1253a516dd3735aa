/**
 * Outside diameter from a calliper over two tips. With an odd count no two tips stand opposite, so the reading from
 * a tip to the nearest one across is a chord and low.
 */

/**
 * da = M / cos(90° / N) for odd N, da = M for even N; M the reading and da the outside diameter, both in mm.
 * Range: N a whole number from 3. Source: geometry of a chord (definition).
 * @example outsideDiameterFromTips(136.8891, 25) // 137.16
 */
export function outsideDiameterFromTips(readingMm: number, teeth: number): number {
	return teeth % 2 === 0 ? readingMm : readingMm / oddFactor(teeth);
}

/**
 * By how much a reading over two tips is low, in mm: da - M; 0 for even N.
 * @example oddCountShortfall(136.8891, 25) // 0.2707
 */
export function oddCountShortfall(readingMm: number, teeth: number): number {
	return outsideDiameterFromTips(readingMm, teeth) - readingMm;
}

function oddFactor(teeth: number): number {
	return Math.cos(Math.PI / (2 * teeth));
}
