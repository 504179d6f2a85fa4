import * as v from 'valibot';
import type { DeepReadonly } from '../base';

/** A value as somebody typed or printed it: the text or number, and its unit. Converted only by the quantity room. */
export const MeasureSchema = v.strictObject({
	value: v.union([v.string(), v.number()]),
	unit: v.string(),
	/** Expanded uncertainty (k = 2) in the same unit. */
	U: v.exactOptional(v.union([v.string(), v.number()])),
});

export const BasisSchema = v.picklist(['wet', 'dry']);

/** Where a limit or a datum comes from. `common practice` is said wherever the value is shown. */
export const SourceSchema = v.strictObject({
	kind: v.picklist([
		'clause',
		'report',
		'drawing',
		'supplier',
		'site',
		'common practice',
		'from memory',
		'demonstration',
	]),
	text: v.string(),
	edition: v.exactOptional(v.string()),
	enteredBy: v.exactOptional(v.string()),
});

const Id = v.pipe(v.string(), v.regex(/^[A-Za-z0-9][A-Za-z0-9._/-]{0,63}$/));
const Text = v.pipe(v.string(), v.minLength(1), v.maxLength(2000));
const Point = v.strictObject({ x: v.number(), y: v.number() });

/** Placing on the process sketch: a grid of 100 x 60 units, origin top left. */
const Place = v.strictObject({
	x: v.number(),
	y: v.number(),
	width: v.exactOptional(v.number()),
	height: v.exactOptional(v.number()),
});

const Outline = v.picklist([
	'hot gas generator',
	'mill',
	'bag filter',
	'fan',
	'bin',
	'silo',
	'chute',
	'screw',
	'duct',
	'stack',
	'vessel',
]);

/** An enclosed volume: every one of them stands in the coverage table of a purge. */
const EnclosedVolume = v.strictObject({
	id: Id,
	title: Text,
	volume: MeasureSchema,
	/** Outline of the process sketch. */
	outline: Outline,
	/** A dead leg is not swept by the circuit gas: it needs its own answer in the coverage table. */
	deadLeg: v.boolean(),
	/** Steel walls that can be the coldest place of the gas. */
	walls: v.exactOptional(v.array(v.strictObject({ id: Id, title: Text, point: v.exactOptional(Id) }))),
	sketch: Place,
});

/** Drawn for orientation and open to the air: raw-fuel bin, stack. Not part of what is purged. */
const Surrounding = v.strictObject({ id: Id, title: Text, outline: Outline, sketch: Place });

const Duct = v.strictObject({
	id: Id,
	title: Text,
	/** A volume, a surrounding, an inert source, or `outside`. */
	from: Id,
	to: Id,
	diameter: MeasureSchema,
	length: v.exactOptional(MeasureSchema),
	medium: v.picklist(['process gas', 'hot gas', 'inert gas', 'fresh air', 'fuel', 'dust', 'stack gas']),
	/** Corner points on the sketch, from start to end. */
	sketch: v.array(Point),
});

/** A valve, damper or gate whose position the line-up table asks for. */
const Element = v.strictObject({
	tag: Id,
	title: Text,
	kind: v.picklist(['valve', 'damper', 'slide gate', 'rotary valve', 'door', 'explosion vent', 'blind']),
	duct: v.exactOptional(Id),
	positions: v.array(v.string()),
	sketch: Point,
});

const MeasuringPoint = v.strictObject({
	tag: Id,
	title: Text,
	/** Name of the quantity room; wet and dry are different quantities. */
	quantity: v.string(),
	unit: v.string(),
	/** The basis belongs to the point, never to the step sheet. */
	basis: v.exactOptional(BasisSchema),
	/** Id of the volume, duct, surrounding or inert source that is read, or `outside`. */
	at: Id,
	medium: v.picklist(['process gas', 'hot gas', 'inert gas', 'ambient', 'steel', 'oil', 'fuel', 'none']),
	range: v.strictObject({ from: v.number(), to: v.number() }),
	resolution: v.exactOptional(MeasureSchema),
	/** Expanded uncertainty (k = 2) of a reading: a difference, K for degC, mbar for mbar(g). */
	uncertainty: v.exactOptional(MeasureSchema),
	principle: v.exactOptional(v.string()),
	lag: v.exactOptional(MeasureSchema),
	t90: v.exactOptional(MeasureSchema),
	instrument: v.exactOptional(Id),
	/** Centre of the bubble; absent: not drawn. */
	sketch: v.exactOptional(Point),
	/** Side of the bubble on which its value is written. */
	side: v.exactOptional(v.picklist(['left', 'right'])),
	/** Where its leader meets the plant; absent: the middle of `at`. */
	tap: v.exactOptional(Point),
});

const Venturi = v.strictObject({
	tag: Id,
	title: Text,
	variant: v.picklist(['as_cast', 'machined', 'rough_welded']),
	pipeDiameter: MeasureSchema,
	throatDiameter: MeasureSchema,
	expansion: v.strictObject({ value: v.number(), unit: v.literal('1/K') }),
	duct: Id,
	/** Flow, difference and static pressure, temperature: the points that feed the calculation. */
	points: v.strictObject({ difference: Id, pressure: Id, temperature: Id }),
	span: MeasureSchema,
	calibrated: v.boolean(),
	drawing: v.exactOptional(v.string()),
	certificate: v.exactOptional(v.string()),
});

const InertSource = v.strictObject({
	tag: Id,
	title: Text,
	gas: v.picklist(['nitrogen', 'carbon dioxide']),
	oxygen: MeasureSchema,
	/** The inert gas meter: only a flow read here may count as admitted. */
	meter: Id,
	stock: v.strictObject({
		content: MeasureSchema,
		reserve: MeasureSchema,
		minimumPressure: v.exactOptional(MeasureSchema),
	}),
	sketch: Place,
});

const Fuel = v.strictObject({
	title: Text,
	limitingOxygen: v.exactOptional(
		v.strictObject({
			value: MeasureSchema,
			basis: BasisSchema,
			inertGas: v.string(),
			particleSize: v.string(),
			igniter: v.string(),
			temperature: v.string(),
			report: Text,
			date: v.string(),
		}),
	),
	moisture: v.exactOptional(v.strictObject({ feed: MeasureSchema, product: MeasureSchema })),
	feedRate: v.exactOptional(MeasureSchema),
	maximumOutletTemperature: v.exactOptional(MeasureSchema),
	/** The measuring point at the mill outlet that this maximum is for. */
	outletPoint: v.exactOptional(Id),
});

/** A limit is data of the unit: value, unit, source, edition, who entered it. Never a constant in code. */
const Limit = v.strictObject({
	id: Id,
	title: Text,
	quantity: v.string(),
	basis: v.exactOptional(BasisSchema),
	atMost: v.exactOptional(MeasureSchema),
	atLeast: v.exactOptional(MeasureSchema),
	/** Kept between the reading and the limit (JCGM 106); the reading passes at the limit less the guard. */
	guard: v.exactOptional(MeasureSchema),
	/** Measuring points that the limit is for: limits of one point must leave something between them. */
	appliesTo: v.exactOptional(v.array(Id)),
	source: SourceSchema,
});

const Instrument = v.strictObject({
	id: Id,
	title: Text,
	serial: v.string(),
	point: v.exactOptional(Id),
	accuracy: v.exactOptional(v.string()),
	certificate: v.string(),
	/** A date: a calibration is good until 24:00 plant time of that day. */
	due: v.pipe(v.string(), v.isoDate()),
});

/**
 * Of a description that was begun as a copy of another unit's. An item is named by its path, `volumes/HG-21`, or by the
 * name of what there is one of: `fuel`, `purge`, `altitude`.
 */
const Copied = v.strictObject({
	from: Text,
	/** Items whose values are still those of the unit copied: no gate is released on them. */
	toReplace: v.array(Text),
	/** Items whose values somebody has replaced, or has found to be this unit's own. */
	replaced: v.array(v.strictObject({ item: Text, by: Id, at: Text })),
});

/** One plant unit: equipment, volumes, ducts, measuring points, limits and fuel data. Pinned by hash in a start-up. */
export const PlantSchema = v.strictObject({
	format: v.literal('gatehold-plant/1'),
	unit: Id,
	title: Text,
	site: Text,
	revision: v.pipe(v.number(), v.integer(), v.minValue(1)),
	/** Printed on every export of invented data. */
	demonstration: v.boolean(),
	/** Minutes east of UTC, for plant local time. */
	utcOffsetMinutes: v.pipe(v.number(), v.integer()),
	altitude: v.exactOptional(MeasureSchema),
	/** Site data of the purge: engineering values that no formula gives. */
	purge: v.exactOptional(
		v.strictObject({
			filterCleaningCycle: MeasureSchema,
			circuitGasFlow: MeasureSchema,
			/** Planned flow of inert gas, by its own meter. */
			inertGasFlow: v.exactOptional(MeasureSchema),
			minimumVolumeChanges: v.exactOptional(v.number()),
			outlet: Text,
		}),
	),
	volumes: v.array(EnclosedVolume),
	surroundings: v.exactOptional(v.array(Surrounding)),
	ducts: v.array(Duct),
	elements: v.array(Element),
	points: v.array(MeasuringPoint),
	venturis: v.array(Venturi),
	inertSources: v.array(InertSource),
	instruments: v.array(Instrument),
	fuel: Fuel,
	limits: v.array(Limit),
	copied: v.exactOptional(Copied),
});

export type Measure = DeepReadonly<v.InferOutput<typeof MeasureSchema>>;
export type Plant = DeepReadonly<v.InferOutput<typeof PlantSchema>>;
export type Basis = DeepReadonly<v.InferOutput<typeof BasisSchema>>;
export type Source = DeepReadonly<v.InferOutput<typeof SourceSchema>>;
