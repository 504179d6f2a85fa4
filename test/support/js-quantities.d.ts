/** The part of js-quantities that our tests ask as an oracle; the package itself brings no types. */
declare module 'js-quantities' {
	type Quantity = { readonly scalar: number; toBase(): Quantity };
	export default function Qty(value: number, unit: string): Quantity;
}
