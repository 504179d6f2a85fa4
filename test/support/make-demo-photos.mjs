// Draws the two pictures that the demonstration start-up holds as photos: `node test/support/make-demo-photos.mjs`.
// Drawings, marked as such, so that nobody takes them for a photo of a plant.
import { writeFileSync } from 'node:fs';
import { withChromium } from './chromium.mjs';

/** @type {(drawing: string) => string} */
const frame = (
	drawing,
) => `<body style="margin:0;background:#d9d6cc"><svg width="640" height="480" viewBox="0 0 640 480"
	fill="none" stroke="#14171a" stroke-width="5" font-family="sans-serif">${drawing}
	<text x="20" y="462" font-size="22" fill="#14171a" stroke="none">Demonstration picture, drawn. No real plant.</text></svg></body>`;

const PICTURES = {
	'fire-fighting-and-vent.jpg': frame(
		`<path d="M90 400V190q0-40 40-40h20q40 0 40 40v210z" fill="#b8483c"/><path d="M140 150v-36h70"/>
		 <path d="M330 400V120M400 400V120M300 120h130l-65-56z" fill="#b9bdb8"/><path d="M230 400h380"/>
		 <path d="M470 300h120M470 330h120" stroke-dasharray="14 10"/>`,
	),
	'emergency-inerting-valve.jpg': frame(
		`<path d="M0 250h210M430 250h210" stroke-width="26"/><path d="M210 190l220 120V190L210 310z" fill="#b9bdb8"/>
		 <path d="M320 250V120M260 120h120"/><path d="M360 130v54h70v-54" /><rect x="352" y="150" width="86" height="62" fill="#d8b23c"/>`,
	),
};

await withChromium(async (browser) => {
	const page = await browser.newPage();
	await page.setViewportSize({ width: 640, height: 480 });
	for (const [name, html] of Object.entries(PICTURES)) {
		await page.setContent(html);
		const bytes = await page.screenshot({ type: 'jpeg', quality: 72 });
		writeFileSync(new URL(`../../static/demo/photos/${name}`, import.meta.url), bytes);
	}
});
