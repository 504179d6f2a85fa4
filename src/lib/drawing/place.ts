import type { Drawing, Point, Segment, Shape } from './shape';

/** The same shapes elsewhere and at another size. Pens keep their weight: a line is as thick on a small drawing as on a large one. */
export const placed = (shapes: readonly Shape[], at: Point, scale = 1): readonly Shape[] =>
	shapes.map((shape) => place(shape, at, scale));

/** A drawing fitted to a width, with its top left corner at `at`. */
export const fitted = (drawing: Drawing, at: Point, width: number): readonly Shape[] =>
	placed(drawing.shapes, at, width / drawing.width);

function place(shape: Shape, at: Point, scale: number): Shape {
	switch (shape.kind) {
		case 'path':
			return { ...shape, path: shape.path.map((segment) => placeSegment(segment, at, scale)) };
		case 'text':
			return { ...shape, x: at.x + shape.x * scale, y: at.y + shape.y * scale, size: shape.size * scale };
		case 'group':
			return { ...shape, shapes: placed(shape.shapes, at, scale) };
	}
}

function placeSegment(segment: Segment, at: Point, scale: number): Segment {
	const x = (value: number) => at.x + value * scale;
	const y = (value: number) => at.y + value * scale;
	switch (segment[0]) {
		case 'M':
		case 'L':
			return [segment[0], x(segment[1]), y(segment[2])];
		case 'C':
			return ['C', x(segment[1]), y(segment[2]), x(segment[3]), y(segment[4]), x(segment[5]), y(segment[6])];
		case 'Z':
			return segment;
	}
}
