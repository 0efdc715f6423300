export { capital } from '$lib/stats/words/capital';
