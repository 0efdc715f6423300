export { sayHowOften, sayP } from '$lib/stats/words/say-p';
