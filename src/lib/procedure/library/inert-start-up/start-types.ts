import type { StartType, Step } from '../../schema';

/** Of what kind this start is, and which steps each kind does without. The block "Fuel inside" is in all of them. */
export const startTypes = (steps: readonly Step[]): readonly StartType[] => [
	{ id: 'first-start', title: 'First start after erection', without: [], needsReleasingRole: false, excludedBy: [] },
	{ id: 'after-overhaul', title: 'After overhaul', without: ['7.5'], needsReleasingRole: true, excludedBy: [] },
	{
		id: 'after-opening',
		title: 'After an item was opened up',
		without: ['0.3', '1.8', '7.5'],
		needsReleasingRole: true,
		excludedBy: ['protection-operated'],
	},
	{
		id: 'standstill-with-fuel',
		title: 'After a standstill with fuel inside, nothing opened',
		without: ['0.3', '1.4', '1.6', '1.8', '7.5'],
		needsReleasingRole: true,
		excludedBy: ['opened', 'protection-operated'],
	},
	{
		id: 'after-trip',
		title: 'After a trip, nothing opened',
		without: allBut(AFTER_TRIP, steps),
		needsReleasingRole: true,
		excludedBy: ['opened', 'protection-operated', 'inerting-operated', 'power-dip'],
	},
	{
		id: 'after-drill',
		title: 'After a drill of emergency inerting, nothing opened',
		without: allBut([...AFTER_TRIP, ...AFTER_INERTING], steps),
		needsReleasingRole: true,
		excludedBy: ['opened', 'protection-operated', 'power-dip'],
	},
];

const allBut = (kept: readonly string[], steps: readonly Step[]): readonly string[] =>
	steps.map(({ id }) => id).filter((id) => !kept.includes(id));

/** What a warm restart in the same shift proves again. Everything else has just been proved and nobody touched it. */
const AFTER_TRIP = [
	...['0.8', '0.9', '0.10', '0.11', '0.12', '0.13'],
	...['1.10', '1.11'],
	...['2.1', '2.2', '2.3', '2.4', '2.5', '2.6', '2.8', '2.9', '2.13', '2.14', '2.15', '2.17', '2.18', '2.19'],
	...['2.20', '2.21', '2.22', '2.23', '2.24', '2.25', '2.26'],
	...['3.2', '3.6', '4.1', '4.2', '4.3', '4.4', '4.6', '4.7'],
	...['5.1', '5.2', '5.5', '6.1', '6.2', '6.3', '6.5', '6.6', '6.9', '7.1', '7.4'],
];

const AFTER_INERTING = ['0.14', '0.15', '1.13', '1.15', '2.10', '2.11', '2.12', '7.3'];
