import { runAsChild } from '../as-child.js';
import { startFakeTill } from './fake-till.js';

runAsChild(startFakeTill);
