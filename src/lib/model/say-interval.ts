export { sayInterval } from '$lib/stats/words/say-interval';
