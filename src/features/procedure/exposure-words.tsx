import type { ReactNode } from 'react';
import type { Estimated, Remark } from '../../../shared/contract/common';
import { jobNames } from '../../../shared/contract/person';
import { dutyNames } from '../../../shared/contract/record';
import type { StaffExposure } from '../../../shared/contract/staff-exposure';
import { formatScatter, formatScatterInterval } from '../../../shared/units';
import { findLogRange } from '../../lib/log-scale';
import { QuantitySign } from '../../ui/quantity-sign';

/** Who it is, as far as the reader may see: name, visitor, own row, else the job. */
export function nameExposed(exposure: StaffExposure): string {
  if (exposure.person) return exposure.person.name;
  if (exposure.visitorName) return `${exposure.visitorName} (visitor)`;
  if (exposure.isOwn) return 'You';
  return exposure.job === null ? 'Visitor' : jobNames[exposure.job];
}

export const describeDuty = (exposure: StaffExposure): string => {
  const duty = dutyNames[exposure.duty];
  const job = exposure.job === null ? null : jobNames[exposure.job];
  // Where the job stands for the name, or equals the duty, it is not said twice.
  return job === null || !exposure.person || job === duty ? duty : `${duty}, ${job.toLowerCase()}`;
};

export const evidenceWords: Record<StaffExposure['evidenceGrade'], string> = {
  A: 'inspected in date',
  B: 'inspection overdue: not confirmed',
  C: 'condition not known',
  D: 'failed its inspection',
};

type Figure = (exposure: StaffExposure) => Estimated | null;

export type ExposureQuantity = { key: string; head: ReactNode; name: string; unit: string; read: Figure };

/** The figures of a staff row, from the open air to the body. */
export const exposureQuantities: readonly ExposureQuantity[] = [
  {
    key: 'collar-kerma',
    head: (
      <>
        <QuantitySign of="scatterAirKerma" /> collar, no screens
      </>
    ),
    name: 'scatter air kerma at the collar without screens',
    unit: 'µGy',
    read: (exposure) => exposure.collarAirKermaUGy,
  },
  {
    key: 'collar',
    head: (
      <>
        <QuantitySign of="hp10" /> collar, behind screens
      </>
    ),
    name: 'Hp(10) at the collar behind screens',
    unit: 'µSv',
    read: (exposure) => exposure.collarHp10USv,
  },
  {
    key: 'eye',
    head: (
      <>
        <QuantitySign of="hp3" /> eye
      </>
    ),
    name: 'Hp(3) at the eye',
    unit: 'µSv',
    read: (exposure) => exposure.eyeHp3USv,
  },
  {
    key: 'under',
    head: (
      <>
        <QuantitySign of="hp10" /> under garment
      </>
    ),
    name: 'Hp(10) under the garment',
    unit: 'µSv',
    read: (exposure) => exposure.underGarmentHp10USv,
  },
  {
    key: 'effective',
    head: (
      <>
        <QuantitySign of="effectiveDose" />
      </>
    ),
    name: 'effective dose',
    unit: 'µSv',
    read: (exposure) => exposure.effectiveDoseUSv,
  },
];

/** One scale for all people and quantities of a procedure; null where nothing was estimated. */
export const findExposureScale = (exposures: readonly StaffExposure[]) =>
  findLogRange(
    exposures.flatMap((exposure) =>
      exposureQuantities.flatMap(({ read }) => {
        const figure = read(exposure);
        return figure === null ? [] : [figure.low, figure.nominal, figure.high];
      }),
    ),
  );

export const writeFigure = (figure: Estimated | null, unit: string): string =>
  figure === null
    ? 'not estimated'
    : `${formatScatter(figure.nominal)} ${unit}, interval ${formatScatterInterval(figure.low, figure.high)}`;

/** What the row must say at once: why a figure is missing, or why it is nothing. */
export const findRowRemarks = (exposure: StaffExposure): Remark[] => [
  ...(exposure.collarAirKermaUGy?.high === 0
    ? exposure.warnings.filter(({ code }) => code === 'behind-barrier')
    : []),
  ...exposure.gaps,
];

/** What stands between the person and the scatter, in words. */
export const describeProtection = (exposure: StaffExposure): string =>
  [exposure.garmentLabel ?? 'garment not told', ...exposure.shieldLabels].join(' · ');
