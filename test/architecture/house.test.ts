import { join } from 'node:path';
import { expect, test } from 'vitest';
import * as imports from './checks/imports';
import * as layout from './checks/layout';
import * as text from './checks/text';
import { readTree, type Check } from './tree';

const house = readTree(join(import.meta.dirname, '../..'));

const rules: readonly (readonly [string, Check])[] = [
	['the top level is the plan, and nothing else', layout.topLevelIsThePlan],
	['src holds the rooms of the plan, and no others', layout.srcHoldsThePlan],
	['tests mirror the rooms', layout.testsMirrorTheRooms],
	['a SPEC.md stands only where a stranger must rebuild our reader', layout.specsStandWhereAStrangerNeedsThem],
	['no file is longer than 400 lines', layout.filesStayShort],
	['names are kebab-case, components PascalCase', layout.namesFollowTheHouse],
	['no name is vague', layout.namesSaySomething],
	['rooms import strictly downward', imports.importsGoDownward],
	['rooms are entered by their door, never by their own', imports.roomsAreEnteredByTheirDoor],
	['nothing imports a route or a command', imports.nothingImportsRoutesOrCommands],
	['every import leads somewhere', imports.importsLeadSomewhere],
	['no circle of imports', imports.noCircles],
	['every door has its sign', text.everyDoorHasItsSign],
	['no default exports', text.noDefaultExports],
	['no markup from data', text.noHtmlFromData],
	['every test runs', text.everyTestRuns],
	['nothing is left behind', text.nothingIsLeftBehind],
	['no word that must not stand here', text.noForbiddenWords],
	['no path or address of one machine', text.noPlacesOfOneMachine],
	['pure rooms have no clock, chance, network or screen', text.pureRoomsAreBlind],
];

test.each(rules)('%s', (_rule, check) => {
	expect(check(house)).toEqual([]);
});
