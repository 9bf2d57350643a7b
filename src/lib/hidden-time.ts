import { deviceFlag } from './device-flag.ts';

const flag = deviceFlag('plait.time', 'hidden');

/** True where the reader hid the time of a set, on this device. */
export const isTimeHidden = flag.isSet;

/** Keeps on this device whether the time of a set is hidden. */
export const hideTime = flag.set;
