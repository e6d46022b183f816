// Deletes an organisation with everything it has, under the role that may do nothing else. It cannot be undone.
import { eraseOrganisation } from '../db/erase-organisation';

const [id, ...name] = process.argv.slice(2);
const url = process.env.ERASER_DATABASE_URL;

if (!id || name.length === 0 || !url) {
  process.stderr.write('Usage: ERASER_DATABASE_URL=… erase-organisation.ts <id of the organisation> <its name, as a second look>\n');
  process.exit(1);
}
const erased = await eraseOrganisation(url, { organisationId: id, name: name.join(' ') });
process.stdout.write(`${erased.toLocaleString('en-US')} rows of ${name.join(' ')} are gone. People who belonged to it keep their sign-in.\n`);
