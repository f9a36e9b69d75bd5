import { exposureFilterSchema } from '../../../shared/contract/staff-exposure';

/** What a person may ask of the own figures: which quantity, and over which period. */
export const ownFilterSchema = exposureFilterSchema.pick({ quantity: true, period: true });
