import { existsSync } from 'node:fs';
import path from 'node:path';

const build = path.join(import.meta.dirname, '..', '.next', 'BUILD_ID');
if (!existsSync(build)) {
  console.error('\nThere is no build to start yet. Run: npm run build\n');
  process.exit(1);
}
