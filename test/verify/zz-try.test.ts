import {test} from 'vitest';
import { makeSignedRecord, judge } from '/work/main/test/support/signed-record';
test('x', async () => {
 const r = await makeSignedRecord();
 console.time('v'); const rep = await judge(r); console.timeEnd('v');
 console.log(rep.class, rep.sub, JSON.stringify(rep.process), JSON.stringify(rep.counts), JSON.stringify(rep.checked));
 for (const c of rep.checks) console.log(c.outcome, '|', c.name, '|', c.because);
});
