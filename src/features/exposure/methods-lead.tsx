import {
  garmentTransmission,
  heavyCopperMm,
  heavyCopperShiftKv,
  leadFreeFactor,
} from '../../../shared/dosimetry/garment-transmission';
import { archerLeadPrimary, archerLeadSecondary } from '../../../shared/dosimetry/archer-lead.table-data';
import { leadTransmission } from '../../../shared/dosimetry/lead-transmission';
import { formatPercent, formatSignificant } from '../../../shared/units';
import { DataTable } from '../../ui/data-table';
import { Section } from '../../ui/margin-note';
import { PlotWithTable } from './plot-with-table';

const kvps = [60, 80, 100, 120];
const thicknesses = Array.from({ length: 51 }, (_, step) => step * 0.02);
const fits = [
  ...archerLeadPrimary.map((row) => ({ ...row, table: 'primary (A.1)' })),
  ...archerLeadSecondary.map((row) => ({ ...row, table: 'secondary (C.1)' })),
];
const example = { kvp: 80, leadMm: 0.35, isLeadFree: false };

/** How much of the scatter passes a garment. */
export const MethodsLead = () => (
  <Section title="Transmission of lead" note="broad beam">
    <p className="max-w-[44rem]">
      B = [(1 + β/α) e<sup>αγx</sup> − β/α]<sup>−1/γ</sup> with the larger of the fits for primary and for
      secondary radiation, ln B linear in kVp between the rows. Behind {heavyCopperMm} mm copper and more it
      is read {heavyCopperShiftKv} kV higher (at 80 kVp, 0.35 mm:{' '}
      {formatPercent(garmentTransmission({ ...example, copperMm: heavyCopperMm }))} instead of{' '}
      {formatPercent(garmentTransmission({ ...example, copperMm: null }))}); lead-free material known by
      narrow beam counts × {leadFreeFactor}. A defect of area share f gives{' '}
      <span className="whitespace-nowrap">T′ = (1 − f) T + f</span>.
    </p>
    <PlotWithTable
      lines={kvps.map((kvp) => ({
        name: `${kvp} kVp`,
        points: thicknesses.map((leadMm) => ({ x: leadMm, y: leadTransmission(kvp, leadMm) })),
      }))}
      x={{
        from: 0,
        to: 1,
        ticks: [0, 0.25, 0.5, 0.75, 1],
        title: 'lead, mm',
        format: (value) => value.toFixed(2),
      }}
      y={{
        from: 1e-5,
        to: 1,
        isLog: true,
        ticks: [1e-5, 1e-4, 1e-3, 1e-2, 1e-1, 1],
        title: 'transmitted share',
        format: formatPercentFine,
      }}
      label={`Transmission of lead from 0 to 1 mm at ${kvps.join(', ')} kVp`}
      rowHead="Lead, mm"
      rowsAt={[0.25, 0.35, 0.5, 0.75, 1]}
      valueAt={(line, leadMm) => formatPercentFine(leadTransmission(kvps[line] ?? 0, leadMm))}
    />
    <details>
      <summary className="link-line w-fit text-sm">All fits: α, β, γ (NCRP 147; Simpkin 1995)</summary>
      <DataTable
        caption="Fits of broad-beam transmission through lead"
        rows={fits}
        rowKey={({ table, kvp }) => `${table} ${kvp}`}
        hasStickyHead={false}
        columns={[
          { key: 'table', head: 'Radiation', phone: 'title', cell: ({ table }) => table },
          { key: 'kvp', head: 'kVp', align: 'end', cell: ({ kvp }) => kvp },
          { key: 'alpha', head: 'α', unit: '1/mm', align: 'end', cell: (row) => row.alphaPerMm },
          { key: 'beta', head: 'β', unit: '1/mm', align: 'end', cell: (row) => row.betaPerMm },
          { key: 'gamma', head: 'γ', align: 'end', cell: (row) => row.gamma },
        ]}
      />
    </details>
  </Section>
);

/** Two digits also far below one percent, where the common format would print 0.0. */
const formatPercentFine = (share: number): string =>
  share < 0.01 ? `${formatSignificant(share * 100, 2)} %` : formatPercent(share);
