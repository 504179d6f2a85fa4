/**
 * Maximum allowed oxygen below a limiting oxygen concentration: the margin that a plant keeps from its fuel's limit.
 *
 *     monitored:      LOC − 2 %  for LOC ≥ 5 %, else 0.6 LOC
 *     not monitored:  0.6 LOC    for LOC ≥ 5 %, else 0.4 LOC
 *
 * @param LOC limiting oxygen concentration of the fuel, by test [1]
 * @param oxygen whether it is continuously monitored and interlocked
 * @returns MAOC [1]
 *
 * Source: NFPA 69, 7.7.2 in the editions 2008 to 2019 (from memory, verify).
 * Checked against: the values of that clause (test/calc/purge/allowed-oxygen.test.ts).
 */
export function allowedOxygen(LOC: number, oxygen: 'monitored' | 'not monitored'): number {
	if (oxygen === 'monitored') return LOC >= 0.05 ? LOC - 0.02 : 0.6 * LOC;
	return LOC >= 0.05 ? 0.6 * LOC : 0.4 * LOC;
}
