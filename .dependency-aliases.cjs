/** Kit's one path alias, in the form dependency-cruiser can read (it ignores the generated tsconfig). */
const { join } = require('node:path');

module.exports = { resolve: { alias: { $lib: join(process.cwd(), 'src', 'lib') } } };
