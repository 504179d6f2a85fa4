import type { Json } from '../../base';
import { shownUnit } from '../../quantity';
import { sayNumber, type Say } from '../../wording';

/** One input of a calculation as it is stored, in lines that people can read. */
export function inputLines(
	inputs: Json,
	say: Say,
): readonly { readonly name: string; readonly lines: readonly string[] }[] {
	if (typeof inputs !== 'object' || inputs === null || Array.isArray(inputs))
		return [{ name: '', lines: [said(inputs, say)] }];
	return Object.entries(inputs).map(([name, value]) => ({ name, lines: linesOf(value, say) }));
}

/** A list is told item by item, a group part by part, everything else in one line. */
function linesOf(value: Json, say: Say): readonly string[] {
	if (Array.isArray(value) && value.some((item) => typeof item === 'object'))
		return value.map((item: Json) => said(item, say));
	if (isGroup(value) && !isMeasure(value) && Object.values(value).some(isGroup)) {
		return Object.entries(value).map(([name, part]) => `${name}: ${said(part, say)}`);
	}
	return [said(value, say)];
}

function said(value: Json, say: Say): string {
	if (typeof value === 'number') return sayNumber(value, say);
	if (typeof value === 'string') return value;
	if (value === null || typeof value === 'boolean') return String(value);
	if (Array.isArray(value)) {
		const isLong = value.length > 8 && value.every((item) => typeof item === 'number');
		return isLong
			? say('app.origin.entries', { n: value.length })
			: value.map((item: Json) => said(item, say)).join(' / ');
	}
	const group = value as { readonly [name: string]: Json };
	if (isMeasure(group)) {
		const spread = group.U === undefined ? '' : ` ± ${said(group.U, say)}`;
		return `${said(group.value ?? '', say)}${spread}\u00a0${shownUnit(said(group.unit ?? '', say))}`.trim();
	}
	return Object.entries(group)
		.map(([name, part]) => `${name} ${said(part, say)}`)
		.join(', ');
}

const isGroup = (value: unknown): value is { readonly [name: string]: Json } =>
	typeof value === 'object' && value !== null && !Array.isArray(value);

const isMeasure = (value: { readonly [name: string]: Json }): boolean =>
	'value' in value && 'unit' in value && Object.keys(value).every((key) => ['value', 'unit', 'U'].includes(key));
