const DAY = 86_400_000;

/**
 * Moves every time of a text: local times and instants by so many milliseconds, dates that stand alone by whole days. An
 * offset behind a time stays, and with it what the plant's clock showed.
 *
 * @param by milliseconds, a whole number of seconds
 */
export function shiftTimes(text: string, by: number): string {
	return text
		.replace(/\b(\d{4}-\d\d-\d\d)T(\d\d:\d\d:\d\d)/g, (_, day: string, time: string) => iso(`${day}T${time}Z`, by))
		.replace(/\b(\d\d)\.(\d\d)\.(\d{4}) (\d\d:\d\d:\d\d)/g, (_, d: string, m: string, y: string, time: string) => {
			const [date = '', clock = ''] = iso(`${y}-${m}-${d}T${time}Z`, by).split('T');
			return `${date.split('-').reverse().join('.')} ${clock}`;
		})
		.replace(/\b(\d{4}-\d\d-\d\d)\b(?!T)/g, (_, day: string) =>
			iso(`${day}T00:00:00Z`, Math.round(by / DAY) * DAY).slice(0, 10),
		);
}

const iso = (instant: string, by: number): string => new Date(Date.parse(instant) + by).toISOString().slice(0, 19);
