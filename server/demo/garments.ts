import type { DemoGarment } from './demo-types';
import { demoStaff } from './staff.table-data';

const numbered = (prefix: string, number: number) => `${prefix}-${String(number).padStart(2, '0')}`;

/** In-service garment with its yearly inspection spread over the year. */
function garment(
  code: string,
  serial: number,
  kind: DemoGarment['kind'],
  lead: Pick<DemoGarment, 'material' | 'frontLeadMm' | 'backLeadMm'>,
  ownerCode: string | null,
): DemoGarment {
  const lastInspectedDaysAgo = 12 + ((serial * 67) % 330);
  return {
    code,
    kind,
    ...lead,
    leadKvp: 100,
    isMeasured: serial % 3 === 0,
    ownerCode,
    state: 'in-service',
    lastInspectedDaysAgo,
    nextDueInDays: 365 - lastInspectedDaysAgo,
    note: null,
  };
}

/** What the inspections of two years found, and the five that are overdue on the anchor day. */
const findings: Readonly<Record<string, Partial<DemoGarment>>> = {
  'VS-04': { state: 'discarded', nextDueInDays: null, note: 'Hole of 22 mm² over the chest, failed' },
  'VS-25': {
    state: 'discarded',
    nextDueInDays: null,
    note: 'Two holes of 8 mm² each over the chest, failed',
  },
  'VS-11': { note: 'Back seam open over 140 mm², passed with a note' },
  'TC-07': { state: 'withdrawn', nextDueInDays: null, note: 'Crack of 14 mm², failed' },
  'VS-26': { state: 'withdrawn', nextDueInDays: null, note: 'Skirt sags, withdrawn' },
  'OP-02': { frontLeadMm: 0.34, isMeasured: true, note: 'Labelled 0.5, measured 0.34 mm Pb, relabelled' },
  'LF-08': { state: 'lost', nextDueInDays: null, note: 'Not found at the yearly count' },
  'VS-09': { lastInspectedDaysAgo: 402, nextDueInDays: -37 },
  'VS-17': { lastInspectedDaysAgo: 371, nextDueInDays: -6 },
  'LF-03': { lastInspectedDaysAgo: 455, nextDueInDays: -90 },
  'TC-02': { lastInspectedDaysAgo: 384, nextDueInDays: -19 },
  'GL-05': { lastInspectedDaysAgo: 430, nextDueInDays: -65 },
};

function listGarments(): DemoGarment[] {
  const monitored = demoStaff.filter((member) => member.isMonitored).map((member) => member.code);
  const operators = monitored.slice(0, 12);
  const anaesthesia = monitored.slice(30);
  const others = monitored.slice(12, 30);
  const heavy = { material: 'lead-composite', frontLeadMm: 0.35, backLeadMm: 0.25 } as const;
  const light = { material: 'lead-free', frontLeadMm: 0.25, backLeadMm: 0.25 } as const;
  const garments: DemoGarment[] = [];
  const add = (
    prefix: string,
    count: number,
    kind: DemoGarment['kind'],
    lead: Parameters<typeof garment>[3],
    owners: readonly (string | null)[],
  ) => {
    for (let number = 1; number <= count; number++) {
      const owner = owners[number - 1] ?? null;
      garments.push(garment(numbered(prefix, number), garments.length + 1, kind, lead, owner));
    }
  };
  // 24 of the 26 two-piece aprons have owners; the last two are those that failed or sag.
  add('VS', 26, 'vest-and-skirt', heavy, [
    ...operators.slice(0, 3),
    null,
    ...operators.slice(3),
    ...others.slice(0, 11),
  ]);
  add('OP', 6, 'one-piece', { material: 'lead', frontLeadMm: 0.5, backLeadMm: 0.25 }, anaesthesia);
  add('LF', 8, 'vest-and-skirt', light, others.slice(11));
  add('TC', 12, 'thyroid-collar', { material: 'lead', frontLeadMm: 0.5, backLeadMm: null }, operators);
  add('GL', 6, 'glasses', { material: 'lead', frontLeadMm: 0.75, backLeadMm: null }, [
    'INR-1',
    'IR-1',
    'IR-3',
    'IC-1',
    'IC-2',
    'EP-1',
  ]);
  add('CS', 4, 'ceiling-screen', { material: 'lead', frontLeadMm: 0.5, backLeadMm: null }, []);
  add('MS', 2, 'mobile-screen', { material: 'lead', frontLeadMm: 1, backLeadMm: null }, []);
  return garments.map((item) => ({ ...item, ...findings[item.code] }));
}

/** 64 garments and screens of the invented hospital. */
export const demoGarments: readonly DemoGarment[] = listGarments();
