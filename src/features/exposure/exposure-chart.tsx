import { useCallback, useMemo } from 'react';
import { ScatterWithMarginals } from '../../charts/scatter-with-marginals';
import { findShadeStep } from '../../charts/shade-step';
import type { ScatterArea } from '../../charts/scatter.types';
import type { ExposurePoint, ExposureQuantity } from '../../../shared/contract/staff-exposure';
import { formatDecimals, formatScatter, formatScatterInterval } from '../../../shared/units';
import { formatDate } from '../../lib/clock';
import { useMediaQuery } from '../../lib/media-query';
import { placePoint } from './chosen-area';
import { findEqualExposures } from './equal-exposure';
import { quantityWords } from './exposure-words';
import { findToneLimits, nameLimit, nameTones } from './tone-limits';

type ExposureChartProps = {
  points: readonly ExposurePoint[];
  quantity: ExposureQuantity;
  area: ScatterArea | null;
  onArea: (area: ScatterArea | null) => void;
  onOpen: (procedureId: string) => void;
};

const formatMinutes = (value: number) => String(value);
const formatKvpTick = (value: number) => String(value);

function describePoint(point: ExposurePoint): string {
  const { low, nominal, high } = point.estimate;
  return [
    point.procedureType,
    [point.room, point.startedAt && formatDate(point.startedAt), point.caseNumber].filter(Boolean).join(', '),
    `FT ${formatDecimals((point.fluoroscopyTimeS ?? 0) / 60, 1)} min, ${formatDecimals(point.kvpMean, 0)} kVp`,
    `${formatScatter(nominal)} µSv (${formatScatterInterval(low, high) ?? ''})`,
  ].join('\n');
}

/** Fluoroscopy time across, kVp up, the estimate as tone and size; dashed: equal exposure at the median rate. */
export function ExposureChart({ points, quantity, area, onArea, onOpen }: ExposureChartProps) {
  const isNarrow = useMediaQuery('(max-width: 47.99rem)');
  const drawn = useMemo(() => {
    const limits = findToneLimits(points.map((point) => point.estimate.nominal));
    const placed = points.flatMap((point) => {
      const place = placePoint(point);
      return place ? [{ point, place }] : [];
    });
    return {
      procedureIds: placed.map(({ point }) => point.procedureId),
      toneNames: nameTones(limits),
      points: placed.map(({ point, place }) => ({
        ...place,
        tone: findShadeStep(point.estimate.nominal, limits) ?? 0,
        text: describePoint(point),
      })),
      guides: findEqualExposures(points, limits.slice(1)).map((guide) => ({
        // On a phone the names would run into each other; the unit stands in the legend.
        name: isNarrow ? nameLimit(guide.valueUSv) : `${nameLimit(guide.valueUSv)} µSv`,
        points: guide.points,
      })),
    };
  }, [points, isNarrow]);
  const openPoint = useCallback(
    (index: number) => {
      const procedureId = drawn.procedureIds[index];
      if (procedureId) onOpen(procedureId);
    },
    [drawn, onOpen],
  );
  const { plainSign } = quantityWords[quantity];
  return (
    <ScatterWithMarginals
      points={drawn.points}
      guides={drawn.guides}
      xTitle="fluoroscopy time, min"
      yTitle="kVp, weighted by KAP"
      formatX={formatMinutes}
      formatY={formatKvpTick}
      toneTitle={`${plainSign}, µSv`}
      toneNames={drawn.toneNames}
      label={`${drawn.points.length} procedures by fluoroscopy time and kVp; tone and size show the estimated ${plainSign}. The table below lists them.`}
      area={area}
      onArea={onArea}
      onOpen={openPoint}
    />
  );
}
