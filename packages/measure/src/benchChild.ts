import './helper/startFirst';
import { measureAndTell } from './bench/benchRuns';

void measureAndTell(process.argv.slice(2)).then(() => process.disconnect());
