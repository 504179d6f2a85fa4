/** A short tone; where the browser has no sound, or was never touched, nothing is heard and nothing breaks. */
export function tone(): void {
	if (typeof AudioContext === 'undefined') return;
	const audio = new AudioContext();
	const [sound, loudness] = [audio.createOscillator(), audio.createGain()];
	sound.frequency.value = PITCH;
	loudness.gain.setValueAtTime(LOUDNESS, audio.currentTime);
	loudness.gain.exponentialRampToValueAtTime(0.001, audio.currentTime + LENGTH);
	sound.connect(loudness).connect(audio.destination);
	sound.onended = () => void audio.close();
	sound.start();
	sound.stop(audio.currentTime + LENGTH);
}

const PITCH = 880;
const LOUDNESS = 0.25;
const LENGTH = 0.35;
