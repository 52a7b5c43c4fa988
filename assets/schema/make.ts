/** Writes the JSON Schema of project files beside this script: `npm run make:schema`. A test fails when the two part ways. */
import { writeFileSync } from 'node:fs';
import { projectJsonSchema } from '../../core/project/schema.ts';

const target = new URL('tautline-project.schema.json', import.meta.url);
writeFileSync(target, `${JSON.stringify(projectJsonSchema(), null, 2)}\n`);
process.stdout.write('assets/schema/tautline-project.schema.json written\n');
