import type { EventType } from '../../shared/contract/report-event';
import type { Plane } from '../../shared/contract/report-parts';
import type { CodeEntry } from './concepts.table-data';

/** Coded values that the reader tells apart; each context group is extensible (PS3.16). */
type ValueTable<Value extends string> = Record<Value, CodeEntry>;

/** CID 10003. */
export const planeValues: ValueTable<Plane> = {
  single: ['DCM', '113622', 'Single Plane'],
  A: ['DCM', '113620', 'Plane A'],
  B: ['DCM', '113621', 'Plane B'],
  all: ['DCM', '113890', 'All Planes'],
};

/** CID 10002. */
export const eventTypeValues: ValueTable<EventType> = {
  fluoroscopy: ['SCT', '44491008', 'Fluoroscopy', 'P5-06000'],
  'stationary-acquisition': ['DCM', '113611', 'Stationary Acquisition'],
  'stepping-acquisition': ['DCM', '113612', 'Stepping Acquisition'],
  'rotational-acquisition': ['DCM', '113613', 'Rotational Acquisition'],
};

/** CID 10004. */
export const fluoroModeValues: ValueTable<'continuous' | 'pulsed'> = {
  continuous: ['DCM', '113630', 'Continuous'],
  pulsed: ['DCM', '113631', 'Pulsed'],
};

/** CID 10007. */
export const filterTypeValues: ValueTable<'flat' | 'wedge' | 'strip' | 'butterfly' | 'none'> = {
  strip: ['DCM', '113650', 'Strip filter'],
  wedge: ['DCM', '113651', 'Wedge filter'],
  butterfly: ['DCM', '113652', 'Butterfly filter'],
  flat: ['DCM', '113653', 'Flat filter'],
  none: ['DCM', '111609', 'No Filter'],
};

/** CID 10006 and 10016. */
export const materialValues: ValueTable<
  'Mo' | 'Al' | 'Cu' | 'Rh' | 'Nb' | 'Eu' | 'Pb' | 'Ta' | 'Ag' | 'Sn' | 'W'
> = {
  Mo: ['SCT', '105860002', 'Molybdenum or Molybdenum compound', 'C-150F9'],
  Al: ['SCT', '105830007', 'Aluminum or Aluminum compound', 'C-120F9'],
  Cu: ['SCT', '105837005', 'Copper or Copper compound', 'C-127F9'],
  Rh: ['SCT', '105877002', 'Rhodium or Rhodium compound', 'C-167F9'],
  Nb: ['SCT', '429310004', 'Niobium or Niobium compound', 'C-1190E'],
  Eu: ['SCT', '429591003', 'Europium or Europium compound', 'C-1190F'],
  Pb: ['SCT', '105842002', 'Lead or Lead compound', 'C-132F9'],
  Ta: ['SCT', '105866008', 'Tantalum or Tantalum compound', 'C-156F9'],
  Ag: ['SCT', '105847008', 'Silver or Silver compound', 'C-137F9'],
  Sn: ['SCT', '105849006', 'Tin or Tin compound', 'C-139F9'],
  W: ['SCT', '105874009', 'Tungsten or Tungsten compound', 'C-164F9'],
};

/** Procedure reported, CID 100 and the values of TID 10001, 10011. */
export const procedureValues: ValueTable<'projection' | 'mammography' | 'ct'> = {
  projection: ['DCM', '113704', 'Projection X-Ray'],
  mammography: ['SCT', '71651007', 'Mammography', 'P5-40010'],
  ct: ['SCT', '77477000', 'Computed Tomography X-Ray', 'P5-08000'],
};

/** CID 10032. */
export const deviceTypeValues: ValueTable<'fluoroscopy-guided' | 'integrated' | 'cassette'> = {
  'fluoroscopy-guided': ['DCM', '113957', 'Fluoroscopy-Guided Projection Radiography System'],
  integrated: ['DCM', '113958', 'Integrated Projection Radiography System'],
  cassette: ['DCM', '113959', 'Cassette-based Projection Radiography System'],
};

/** Observer type, CID 270. */
export const observerValues: ValueTable<'person' | 'device'> = {
  person: ['DCM', '121006', 'Person'],
  device: ['DCM', '121007', 'Device'],
};

/** CID 230. */
export const availabilityValues: ValueTable<'yes' | 'no' | 'undetermined'> = {
  yes: ['SCT', '373066001', 'Yes', 'R-0038D'],
  no: ['SCT', '373067005', 'No', 'R-00339'],
  undetermined: ['SCT', '373068000', 'Undetermined', 'R-0038A'],
};

/** CID 3629, CID 7445 and CID 10020: the single values that change what the reader does. */
export const singleValues: ValueTable<'qualityControl' | 'irradiatingDevice' | 'ppsContent'> = {
  qualityControl: ['DCM', '113680', 'Quality Control Intent'],
  irradiatingDevice: ['DCM', '113859', 'Irradiating Device'],
  ppsContent: ['DCM', '113858', 'MPPS Content'],
};
