import type { PlantEventKind } from '../../schema';

const GAS_TEST =
	'Nitrogen and carbon dioxide asphyxiate without warning: gas test and permit before anyone comes near.';
const KEEP_OFF = 'Keep people away from mill, filter and vents.';

/** What can happen to the unit. What each of them lapses stands in the steps that name it. */
export const PLANT_EVENTS: readonly PlantEventKind[] = [
	{
		id: 'fan-stop',
		title: 'Process-gas fan stopped',
		short: { upToMinutes: 2, countsAs: 'fan-stop-short' },
		showsFirst: ['Is there fuel inside?', 'Is inert gas on?'],
	},
	{ id: 'fan-stop-short', title: 'Process-gas fan stopped, within the allowance', derived: true },
	{ id: 'damper-moved', title: 'Damper of the circuit moved' },
	{ id: 'flow-raised', title: 'Gas flow raised' },
	{
		id: 'burner-air',
		title: 'Burner air reached the loop, or nobody can say that it did not',
		showsFirst: ['Stop the burner air.', 'Is HV-11 shut? Look at the damper.'],
	},
	{ id: 'burner-purge', title: 'Burner chamber purged to the stack, HV-11 seen shut' },
	{ id: 'burner-trip', title: 'Burner tripped', showsFirst: ['Did burner air reach the loop?'] },
	{
		id: 'feed-stop',
		title: 'Fuel feed stopped',
		long: { overMinutes: 15, countsAlsoAs: 'feed-stop-long' },
		showsFirst: ['Is inert gas back on?'],
	},
	{ id: 'feed-stop-long', title: 'Fuel feed stopped for longer than 15 min', derived: true },
	{ id: 'mill-trip', title: 'Mill tripped, no fuel inside', showsFirst: ['Keep inert gas on.', KEEP_OFF] },
	{
		id: 'trip-with-fuel',
		title: 'Mill tripped with fuel inside',
		showsFirst: ['Keep inert gas on.', KEEP_OFF, 'No fan, no burner air, no door.'],
	},
	{ id: 'opened', title: 'Plant item opened up', showsFirst: [GAS_TEST] },
	{
		id: 'inert-loss',
		title: 'Inert gas lost, at low pressure or off purity',
		showsFirst: ['Stop before the purge is lost.'],
	},
	{
		id: 'inerting-operated',
		title: 'Emergency inerting operated, real or drill',
		showsFirst: ['Evacuate.', GAS_TEST],
	},
	{
		id: 'protection-operated',
		title: 'Explosion vent, isolation or suppression operated or disarmed',
		showsFirst: ['Nobody near.', KEEP_OFF],
	},
	{ id: 'power-dip', title: 'Power or control-system dip, restart or forced signal' },
	{ id: 'instrument-air-loss', title: 'Instrument air lost' },
	{ id: 'seal-loss', title: 'Seal gas lost' },
	{ id: 'dust-discharge-stop', title: 'Dust discharge stopped' },
	{ id: 'hopper-high', title: 'Filter hopper high' },
	{ id: 'bag-broken', title: 'Filter bag broken' },
	{
		id: 'unburnt-gas',
		title: 'Unburnt gas in the loop: failed ignition, or flame lost with gas on',
		showsFirst: [
			'The limit of the gas applies, about 5 % oxygen: the dust limits no longer hold.',
			'Do not change the fan speed.',
			'No second ignition before the burner has purged again.',
		],
	},
	{ id: 'high-temperature', title: 'High temperature, alarm or trip', showsFirst: ['Leave the area.'] },
	{ id: 'co-alarm', title: 'Carbon monoxide, alarm or trip', showsFirst: ['Leave the area.'] },
	{ id: 'oxygen-alarm', title: 'Oxygen in the circuit, alarm or trip', showsFirst: ['Inert gas on.'] },
	{ id: 'personal-alarm', title: 'Personal gas monitor alarmed', showsFirst: ['Leave the area.', 'Count the people.'] },
	{
		id: 'fault',
		title: 'Analyser fault',
		showsFirst: ['Read the place with a checked portable at the same port.'],
	},
	{ id: 'fuel-changed', title: 'Fuel changed' },
	{ id: 'bypass-set', title: 'Protective function bypassed' },
	{
		id: 'hand-over-unconfirmed',
		title: 'Shift handed over without confirming the temporary states',
		derived: true,
	},
];
