/** Sorted positions pushed on until they keep their distance, and back again where the last would leave the sheet. */
export function apart(positions: readonly number[], distance: number, end: number): readonly number[] {
	const moved: number[] = [];
	for (const position of positions) moved.push(Math.max(position, (moved.at(-1) ?? -Infinity) + distance));
	let limit = end;
	for (let i = moved.length - 1; i >= 0; i--) {
		moved[i] = Math.min(moved[i] ?? limit, limit);
		limit = (moved[i] ?? limit) - distance;
	}
	return moved;
}
