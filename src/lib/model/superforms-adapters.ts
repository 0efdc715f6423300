/**
 * Stands in for `sveltekit-superforms/adapters` (an alias in vite.config.ts), whose index pulls in a dozen other
 * validators. The package does not export this file by name, hence the path.
 */
export {
  zod as zod4,
  zodClient as zod4Client
} from '../../../node_modules/sveltekit-superforms/dist/adapters/zod4.js';
