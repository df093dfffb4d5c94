import './helper/startFirst';
import { resolve } from 'node:path';
import { measureCommand } from './cli/measureCommand';

/** npm runs scripts in the repository; names of files are meant from where the person stands. */
const startedIn = process.env['INIT_CWD'];
if (startedIn) process.chdir(resolve(startedIn));

void measureCommand(process.argv.slice(2)).then(({ exitCode, stdout, stderr }) => {
  process.stdout.write(stdout);
  process.stderr.write(stderr);
  process.exitCode = exitCode;
});
