import { startHelper } from './takeHelper';

/*
 * Imported before all else by what measures one take and ends: the other thread starts while the rest is loaded. Whoever
 * measures many takes has a helper that rests in between.
 */
startHelper();
