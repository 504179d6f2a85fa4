import type { Flow } from './flow';
import { AREA } from './sheet';
import { wrap } from './wrap';
import { lettering, type Shape, type Voice } from '../../drawing';

export type Fact = { readonly label: string; readonly value: string; readonly voice?: Voice };

/** Small labels over their values, in columns: what there is one of. */
export function facts(flow: Flow, all: readonly Fact[], columns = 3): void {
	const width = AREA.width / columns;
	for (let i = 0; i < all.length; i += columns) {
		const row = all.slice(i, i + columns).map(({ label, value, voice = 'strong' }) => ({
			label,
			voice,
			lines: wrap(value, width - 10, { voice, size: SIZE }),
		}));
		const height = LABEL + Math.max(...row.map(({ lines }) => lines.length)) * LEAD + 5;
		flow.block(height, ({ x, y }) =>
			row.flatMap(({ label, lines, voice }, column): readonly Shape[] => {
				const left = x + column * width;
				return [
					lettering(label, { x: left, y: y + 8 }, { size: 8, tone: 'soft' }),
					...lines.map((line, k) =>
						lettering(line, { x: left, y: y + LABEL + (k + 0.75) * LEAD }, { size: SIZE, voice }),
					),
				];
			}),
		);
	}
}

const SIZE = 9.6;
const LEAD = 12.2;
const LABEL = 10;
