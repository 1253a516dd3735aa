/** The readings that have a picture. */
import type { FieldName } from '../fields';

export type PicturedReading = Exclude<FieldName, 'power' | 'torque' | 'speed' | 'serviceFactor'>;
