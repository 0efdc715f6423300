import adapter from '@sveltejs/adapter-node';
import { vitePreprocess } from '@sveltejs/vite-plugin-svelte';

/** @type {import("@sveltejs/kit").Config} */
export default {
  preprocess: vitePreprocess(),
  kit: {
    adapter: adapter(),
    // A report has fourteen small sheets, and a browser asks for six things at a time: they come with the page instead.
    inlineStyleThreshold: 6000,
    typescript: {
      // Kit looks at .js, .ts and .svelte below src and tests; these are ours too.
      config: (config) => {
        config.include.push('../src/**/*.mjs', '../.ci/**/*.mjs', '../*.config.ts');
      }
    },
    csp: {
      mode: 'auto',
      directives: {
        'default-src': ['self'],
        'script-src': ['self'],
        'style-src': ['self'],
        // Kit's route announcer carries one fixed style attribute; this is its hash.
        'style-src-attr': ['unsafe-hashes', 'sha256-S8qMpvofolR8Mpjy4kQvEm7m1q8clzU4dfDH0AmvZjo='],
        'img-src': ['self', 'data:', 'blob:'],
        'font-src': ['self'],
        'worker-src': ['self'],
        'connect-src': ['self'],
        'form-action': ['self'],
        'frame-ancestors': ['none'],
        'base-uri': ['self'],
        'object-src': ['none']
      }
    }
  }
};
