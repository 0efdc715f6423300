export { default as MadeLink } from './MadeLink.svelte';
export { default as NewLink } from './NewLink.svelte';
