import * as tables from './coded-values.table-data';
import { createValueLookup } from './concepts';

export const planeOf = createValueLookup(tables.planeValues);
/** A public converter from performed procedure steps writes "P5-0600", one zero short. */
export const eventTypeOf = createValueLookup(tables.eventTypeValues, { 'SRT|P5-0600': 'fluoroscopy' });
export const fluoroModeOf = createValueLookup(tables.fluoroModeValues);
export const filterTypeOf = createValueLookup(tables.filterTypeValues);
export const materialOf = createValueLookup(tables.materialValues);
export const procedureOf = createValueLookup(tables.procedureValues);
export const deviceTypeOf = createValueLookup(tables.deviceTypeValues);
export const observerTypeOf = createValueLookup(tables.observerValues);
export const availabilityOf = createValueLookup(tables.availabilityValues);
export const singleValueOf = createValueLookup(tables.singleValues);
