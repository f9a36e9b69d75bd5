import type { WrittenCode } from './written-parts';
import { dcm } from './content-items';

/** A concept SNOMED names twice: its current code and the older SNOMED-RT one (PS3.16 annex L and context groups). */
export interface SnomedPair {
  SCT: WrittenCode;
  SRT: WrittenCode;
}

function pair(sct: string, srt: string, meaning: string): SnomedPair {
  return {
    SCT: { value: sct, scheme: 'SCT', meaning },
    SRT: { value: srt, scheme: 'SRT', meaning },
  };
}

export const snomed = {
  projectionXRay: dcm('113704', 'Projection X-Ray'),
  hasIntent: pair('363703001', 'G-C0E8', 'Has Intent'),
  combinedIntent: pair('371931008', 'R-002E9', 'Combined Diagnostic and Therapeutic Procedure'),
  diagnosticIntent: pair('261004008', 'R-408C3', 'Diagnostic Intent'),
  fluoroscopy: pair('44491008', 'P5-06000', 'Fluoroscopy'),
  anatomicalStructure: pair('91723000', 'T-D0005', 'Anatomical structure'),
  laterality: pair('272741003', 'G-C171', 'Laterality'),
  headfirst: pair('102540008', 'F-10470', 'headfirst'),
  feetFirst: pair('102541007', 'F-10480', 'feet-first'),
  recumbent: pair('102538003', 'F-10450', 'recumbent'),
  supine: pair('40199007', 'F-10340', 'supine'),
  prone: pair('1240000', 'F-10310', 'prone'),
  yes: pair('373066001', 'R-0038D', 'Yes'),
  no: pair('373067005', 'R-00339', 'No'),
  dosimeter: pair('15869005', 'A-2C090', 'Dosimeter'),
  entireBody: pair('38266002', 'T-D0010', 'Entire body'),
  chest: pair('51185008', 'T-D3000', 'Chest'),
  heart: pair('80891009', 'T-32000', 'Heart'),
  abdomen: pair('113345001', 'T-D4000', 'Abdomen'),
};

export const filterMaterials: Record<string, SnomedPair> = {
  Mo: pair('105860002', 'C-150F9', 'Molybdenum or Molybdenum compound'),
  Al: pair('105830007', 'C-120F9', 'Aluminum or Aluminum compound'),
  Cu: pair('105837005', 'C-127F9', 'Copper or Copper compound'),
  Rh: pair('105877002', 'C-167F9', 'Rhodium or Rhodium compound'),
  Nb: pair('429310004', 'C-1190E', 'Niobium or Niobium compound'),
  Eu: pair('429591003', 'C-1190F', 'Europium or Europium compound'),
  Pb: pair('105842002', 'C-132F9', 'Lead or Lead compound'),
  Ta: pair('105866008', 'C-156F9', 'Tantalum or Tantalum compound'),
  Ag: pair('105847008', 'C-137F9', 'Silver or Silver compound'),
  Sn: pair('105849006', 'C-139F9', 'Tin or Tin compound'),
};

export const filterTypes: Record<string, WrittenCode> = {
  strip: dcm('113650', 'Strip filter'),
  wedge: dcm('113651', 'Wedge filter'),
  butterfly: dcm('113652', 'Butterfly filter'),
  flat: dcm('113653', 'Flat filter'),
  none: dcm('111609', 'No Filter'),
};

export const planeCodes: Record<string, WrittenCode> = {
  single: dcm('113622', 'Single Plane'),
  A: dcm('113620', 'Plane A'),
  B: dcm('113621', 'Plane B'),
  all: dcm('113890', 'All Planes'),
};

export const acquisitionTypes: Record<string, WrittenCode> = {
  'stationary-acquisition': dcm('113611', 'Stationary Acquisition'),
  'stepping-acquisition': dcm('113612', 'Stepping Acquisition'),
  'rotational-acquisition': dcm('113613', 'Rotational Acquisition'),
};

export const deviceTypes: Record<string, WrittenCode> = {
  'fluoroscopy-guided': dcm('113957', 'Fluoroscopy-Guided Projection Radiography System'),
  integrated: dcm('113958', 'Integrated Projection Radiography System'),
  cassette: dcm('113959', 'Cassette-based Projection Radiography System'),
};

export const referencePoints: Record<string, WrittenCode> = {
  'isocenter-15-cm-toward-source': dcm('113860', '15cm from Isocenter toward Source'),
  'image-input-surface-30-cm-in-front': dcm('113861', '30cm in Front of Image Input Surface'),
  'tabletop-1-cm-above': dcm('113862', '1cm above Tabletop'),
  'detector-plane': dcm('113941', 'In Detector Plane'),
};

export const scopes: Record<string, { scope: WrittenCode; uid: WrittenCode }> = {
  study: { scope: dcm('113014', 'Study'), uid: dcm('110180', 'Study Instance UID') },
  series: { scope: dcm('113015', 'Series'), uid: dcm('112002', 'Series Instance UID') },
  'performed-procedure-step': {
    scope: dcm('113016', 'Performed Procedure Step'),
    uid: dcm('121126', 'Performed Procedure Step SOP Instance UID'),
  },
  'procedure-step-to-this-point': {
    scope: dcm('113970', 'Procedure Step To This Point'),
    uid: dcm('121126', 'Performed Procedure Step SOP Instance UID'),
  },
  'irradiation-event': {
    scope: dcm('113852', 'Irradiation Event'),
    uid: dcm('113853', 'Irradiation Event UID'),
  },
};
