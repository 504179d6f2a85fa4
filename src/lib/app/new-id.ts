/** The next deviation of a start-up: "D-3". Two tablets apart may take the same; their tablets then stand beside it. */
export function nextDeviation(known: readonly string[], device: string): string {
	const numbers = known.map((id) => Number(/^D-(\d+)/.exec(id)?.[1] ?? 0));
	const plain = `D-${Math.max(0, ...numbers) + 1}`;
	return known.some((id) => id.includes('/')) ? `${plain}/${device}` : plain;
}
