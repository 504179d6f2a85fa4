/**
 * drawing: ladder, process sketch, plots, limit bar and timeline as pure geometry, for screens and paper alike.
 * Pure: shapes with pens and tones, never colours, fonts or pages.
 * May import: base, quantity, identity, calc, plant, procedure, record.
 */
export type {
	Anchor,
	Box,
	Dash,
	Drawing,
	Measure,
	PathShape,
	Pen,
	Point,
	Segment,
	Shape,
	TextShape,
	Tone,
	Voice,
} from './shape';
export { area, group, lettering, stroke } from './shape';
export { circle, polygon, polyline, rectangle, segment } from './path';
export { fitted, placed } from './place';
export { roughly } from './roughly';
export { COLOURS, DASHES, toSvg } from './to-svg';
export { MARK_TONES, markShapes, type Mark } from './marks';
export { ladder, type LadderLook } from './ladder/ladder';
export { rungsOf, type Contact, type ContactState, type Rung } from './ladder/rungs';
export { coilShapes } from './ladder/coil';
export { limitBar, type LimitBar } from './limit-bar';
export { dashOf, drawPlot, type PlotLook } from './plot/draw-plot';
export { shownPlot } from './plot/shown-plot';
export { drawTimeline, type Span, type Timeline, type TimelineLook } from './timeline';
export { processSketch, type SketchLook } from './sketch/process-sketch';
export type { SketchElement } from './sketch/element-names';
export type { SketchReading } from './sketch/bubble';
export { symbolNotation, typeset, type Typeset } from './formula/typeset';
