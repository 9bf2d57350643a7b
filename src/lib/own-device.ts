import { deviceFlag } from './device-flag.ts';

const flag = deviceFlag('plait.device', 'own');

/** True where whoever signed in last said that this device is their own. */
export const isOwnDevice = flag.isSet;

/** Remembers on this device, until the sign-out, whose it is. */
export const rememberDevice = flag.set;
