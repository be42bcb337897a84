import { runAsChild } from '../as-child.js';
import { startFakeMailbox } from './fake-mailbox.js';

runAsChild(startFakeMailbox);
