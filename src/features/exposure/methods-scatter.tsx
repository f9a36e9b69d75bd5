import {
  defaultScatterModel,
  maxScatterAngleDeg,
  minScatterAngleDeg,
  scatterModels,
  type ScatterModelId,
} from '../../../shared/dosimetry/scatter-air-kerma';
import { minDistanceM } from '../../../shared/dosimetry/scatter-geometry';
import { wallMaximumScatterUGyPerGyCm2 } from '../../../shared/dosimetry/wall-maximum-check';
import { formatDecimals } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import { Section } from '../../ui/margin-note';
import { PlotWithTable } from './plot-with-table';

const kvps = [60, 85, 120];
const angles = Array.from({ length: 28 }, (_, step) => minScatterAngleDeg + step * 5);
const { scatterUGyPerGyCm2 } = scatterModels[defaultScatterModel];
const printedAngles = [30, 45, 60, 75, 90, 105, 120, 135, 150, 165];
const models = Object.entries(scatterModels) as [ScatterModelId, (typeof scatterModels)[ScatterModelId]][];

/** Scatter per KAP: the models to choose from, and the default one drawn. */
export const MethodsScatter = () => (
  <Section title="Scatter per KAP" note="S(θ, kVp), 1 m from the isocentre">
    <p className="max-w-[44rem]">
      θ is the angle between the beam’s forward direction and the line from the isocentre to a body point: 90°
      is beside the patient, above 90° towards the tube. Angles are kept to {minScatterAngleDeg}–
      {maxScatterAngleDeg}°, distances to at least {minDistanceM} m: nearer, neither model was measured.
    </p>
    <PlotWithTable
      lines={kvps.map((kvp) => ({
        name: `${kvp} kVp`,
        points: angles.map((angle) => ({ x: angle, y: scatterUGyPerGyCm2(angle, kvp) })),
      }))}
      x={{
        from: minScatterAngleDeg,
        to: maxScatterAngleDeg,
        ticks: [30, 60, 90, 120, 150],
        title: 'scatter angle θ',
        format: (value) => `${value}°`,
      }}
      y={{ from: 0, to: 13, ticks: [0, 2, 4, 6, 8, 10, 12], title: 'S, µGy/(Gy·cm²)', format: String }}
      label={`Scatter per KAP over the scatter angle at ${kvps.join(', ')} kVp, ${scatterModels[defaultScatterModel].name}`}
      rowHead="θ"
      unit="µGy/(Gy·cm²)"
      rowsAt={printedAngles}
      valueAt={(line, angle) => formatDecimals(scatterUGyPerGyCm2(angle, kvps[line] ?? 0), 2)}
    />
    <DataTable
      caption="Scatter models"
      rows={models}
      rowKey={([id]) => id}
      hasStickyHead={false}
      columns={[
        {
          key: 'name',
          head: 'Model',
          phone: 'title',
          cell: ([id, model]) => (id === defaultScatterModel ? `${model.name} (default)` : model.name),
        },
        { key: 'version', head: 'Version', cell: ([, model]) => model.version },
        { key: 'range', head: 'kVp', align: 'end', cell: ([, model]) => `${model.minKvp}–${model.maxKvp}` },
        {
          key: 'value',
          head: 'S at 90°, 85 kVp',
          unit: 'µGy/(Gy·cm²)',
          align: 'end',
          cell: ([, model]) => formatDecimals(model.scatterUGyPerGyCm2(90, 85), 2),
        },
        { key: 'source', head: 'Source', phone: 'wide', cell: ([, model]) => model.source },
      ]}
    />
    <p className="max-w-[44rem] text-sm text-ink-2">
      The simple 0.031 · kV + 2.5 ({formatDecimals(wallMaximumScatterUGyPerGyCm2(85), 2)} µGy/(Gy·cm²) at 85
      kVp) is the largest value on a wall at a perpendicular distance. It serves as a check and estimates
      nobody’s exposure.
    </p>
  </Section>
);
