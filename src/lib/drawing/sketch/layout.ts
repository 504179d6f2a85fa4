import type { Plant } from '../../plant';
import type { Box, Point } from '../shape';
import type { Bubble, SketchReading } from './bubble';
import { distance, nearest, piecesOf, type Run } from './ducts';
import { contourOf, USUAL_SIZES, type Equipment } from './equipment';

/** The plant description on the sheet: everything in units of the drawing. */
export type Layout = {
	readonly equipment: readonly Equipment[];
	readonly runs: readonly Run[];
	readonly elements: readonly { readonly element: Plant['elements'][number]; readonly at: Point }[];
	readonly bubbles: readonly Bubble[];
};

export function layoutOf(
	plant: Plant,
	grid: number,
	margin: number,
	readings: ReadonlyMap<string, SketchReading> | undefined,
): Layout {
	const at = ({ x, y }: Point): Point => ({ x: margin + x * grid, y: margin + y * grid });
	const boxOf = (place: Place, [width, height]: readonly [number, number]): Box => ({
		...at(place),
		width: (place.width ?? width) * grid,
		height: (place.height ?? height) * grid,
	});
	const equipment: readonly Equipment[] = [
		...[...plant.volumes, ...(plant.surroundings ?? [])].map(({ id, title, outline, sketch }) => ({
			id,
			title,
			outline,
			box: boxOf(sketch, USUAL_SIZES[outline]),
		})),
		...plant.inertSources.map(({ tag, title, gas, sketch }) => ({
			id: tag,
			title,
			outline: 'vessel' as const,
			box: boxOf(sketch, USUAL_SIZES.vessel),
			content: gas === 'nitrogen' ? 'N₂' : 'CO₂',
		})),
	];
	const ducts = plant.ducts.map(({ id, medium, sketch }) => ({ id, run: { medium, points: sketch.map(at) } }));
	const bubbles = plant.points.flatMap(({ tag, title, at: where, sketch }): readonly Bubble[] => {
		if (sketch === undefined) return [];
		const centre = at(sketch);
		const reading = readings?.get(tag);
		const tap = tapOf(centre, where, equipment, ducts);
		return [{ tag, title, centre, tap, ...(reading === undefined ? {} : { reading }) }];
	});
	return {
		equipment,
		runs: [...ducts.map(({ run }) => run), ...equipment.filter(({ outline }) => outline === 'duct').map(asRun)],
		elements: plant.elements.map((element) => ({ element, at: at(element.sketch) })),
		bubbles,
	};
}

type Place = Point & { readonly width?: number; readonly height?: number };

/** An enclosed volume that is a duct opens into the ducts that it meets; which way it is swept is not known. */
function asRun({ box: { x, y, width, height } }: Equipment): Run {
	const upright = height > width;
	const [start, end] = upright
		? [
				{ x: x + width / 2, y },
				{ x: x + width / 2, y: y + height },
			]
		: [
				{ x, y: y + height / 2 },
				{ x: x + width, y: y + height / 2 },
			];
	return { medium: 'process gas', points: [start, end], still: true };
}

/** Where a leader ends: the nearest spot of the equipment's edge or of the duct that is read. */
function tapOf(
	centre: Point,
	where: string,
	equipment: readonly Equipment[],
	ducts: readonly { readonly id: string; readonly run: Run }[],
): Point {
	const item = equipment.find(({ id }) => id === where);
	const edge =
		item === undefined
			? (ducts.find(({ id }) => id === where)?.run.points ?? [])
			: closed(contourOf(item.outline, item.box));
	const spots = piecesOf(edge).map((piece) => nearest(centre, piece));
	return spots.sort((a, b) => distance(a, centre) - distance(b, centre))[0] ?? centre;
}

const closed = (points: readonly Point[]): readonly Point[] => [...points, ...points.slice(0, 1)];
