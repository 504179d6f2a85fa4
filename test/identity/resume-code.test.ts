import { expect, test } from 'vitest';
import { isResumeCode, makeResumeCode, webRandom } from '../../src/lib/identity';
import { value } from '../support/test-site';

const beside = { pin: '73905284', random: webRandom };

test('a short code is known again and another is not, and what is kept does not show it', async () => {
	const kept = value(await makeResumeCode('4719', beside));
	expect([await isResumeCode(kept, '4719'), await isResumeCode(kept, '4718')]).toEqual([true, false]);
	expect(JSON.stringify(kept)).not.toContain('4719');
});

test.each([
	['471', 'resume-code-length'],
	['471947194', 'resume-code-length'],
	['47a9', 'resume-code-length'],
	['7777', 'resume-code-easy'],
	['3456', 'resume-code-easy'],
	['9876', 'resume-code-easy'],
	['9052', 'resume-code-in-pin'],
])('%s is no short code: %s', async (code, kind) => {
	expect(await makeResumeCode(code, beside)).toMatchObject({ ok: false, error: { kind } });
});
