import type { ExposureQuantity } from '../../shared/contract/staff-exposure';

const columnsOf = (stem: string) => ({
  nominal: `estimate.${stem}_usv`,
  low: `estimate.${stem}_low_usv`,
  high: `estimate.${stem}_high_usv`,
});

/** Where a quantity and its interval stand in the estimates. */
export const quantityColumns: Record<ExposureQuantity, ReturnType<typeof columnsOf>> = {
  collarHp10USv: columnsOf('collar_hp10'),
  eyeHp3USv: columnsOf('eye_hp3'),
  underGarmentHp10USv: columnsOf('under_garment_hp10'),
  effectiveDoseUSv: columnsOf('effective_dose'),
};

/** What counts for staff: clinical fluoroscopy that nobody withdrew and no hard check stopped. */
export const countedProcedures = `procedure.hospital_id = $1 and procedure.device_class = 'fluoroscopy'
  and procedure.procedure_class = 'clinical' and not procedure.is_withdrawn and not procedure.is_quarantined`;

/** Corrections append estimates; those of the procedure's own revision are the valid ones. */
export const validEstimates =
  'estimate.procedure_id = procedure.id and estimate.revision = procedure.estimate_revision';
