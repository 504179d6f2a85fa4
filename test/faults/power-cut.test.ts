import { join } from 'node:path';
import { expect, test } from 'vitest';
import { canWatchTheMedium, cutPower, watcher } from '../support/power-cut';
import { openTab, servedTablet, withProfile } from '../support/tablet-page';

// By default, without strict durability, all of the 60 are lost here.
test.runIf(canWatchTheMedium)(
	'a power cut that takes everything not yet on the medium takes no entry that was called saved',
	async () => {
		await servedTablet(async ({ address, saved }) =>
			withProfile(async (start, profile) => {
				const trace = join(profile, 'trace');
				const before = await start(watcher(trace));
				expect(await (await openTab(before.context, address)).ask('write', 'technician', 60, 1500)).toBe('written');
				await before.kill();
				cutPower(trace);

				const after = await start();
				const { ids, damaged, findings } = await (await openTab(after.context, address)).ask('look');
				const lost = [...saved].filter((id) => !ids.includes(id));
				expect({ saved: saved.size, lost, damaged, findings }).toEqual({
					saved: 60,
					lost: [],
					damaged: [],
					findings: [],
				});
			}),
		);
	},
	120_000,
);
