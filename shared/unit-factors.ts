/** What kind of quantity a field holds; each kind has one canonical unit. */
export type QuantityKind = keyof typeof factors;

/** UCUM code (PS3.16 uses UCUM for all units) → how much of the canonical unit one such unit is. */
const factors = {
  /** Canonical Gy·cm². 1 uGy.m2 = 1 cGy.cm2 = 0.01 Gy.cm2. */
  kermaAreaProduct: {
    'Gy.m2': 10_000,
    'cGy.m2': 100,
    'mGy.m2': 10,
    'uGy.m2': 0.01,
    'Gy.cm2': 1,
    'dGy.cm2': 0.1,
    'cGy.cm2': 0.01,
    'mGy.cm2': 0.001,
    'uGy.cm2': 1e-6,
  },
  /** Canonical Gy. */
  airKerma: { Gy: 1, dGy: 0.1, cGy: 0.01, mGy: 0.001, uGy: 1e-6, nGy: 1e-9 },
  /** Canonical s. */
  time: { s: 1, ms: 0.001, us: 1e-6, min: 60, h: 3600 },
  /** Canonical mm. */
  length: { mm: 1, cm: 10, dm: 100, m: 1000, um: 0.001 },
  /** Canonical cm². */
  area: { cm2: 1, mm2: 0.01, dm2: 100, m2: 10_000 },
  /** Canonical kV. */
  tubeVoltage: { kV: 1, V: 0.001 },
  /** Canonical mA. */
  tubeCurrent: { mA: 1, A: 1000, uA: 0.001 },
  /** Canonical mA·s. */
  tubeCharge: { 'mA.s': 1, 'uA.s': 0.001, 'A.s': 1000, mC: 1, uC: 0.001, C: 1000 },
  /** Canonical ms. */
  pulseWidth: { ms: 1, us: 0.001, s: 1000 },
  /** Canonical degrees. */
  angle: { deg: 1, rad: 180 / Math.PI },
  /** Canonical 1/s. An annotation in braces has no dimension in UCUM: {pulse}/s is /s. */
  rate: { '/s': 1, '1/s': 1, 's-1': 1, Hz: 1, '/min': 1 / 60, '1/min': 1 / 60 },
  count: { '1': 1, '': 1 },
  percent: { '%': 1 },
} as const satisfies Record<string, Record<string, number>>;

/** Table without prototype keys, so that a unit named "constructor" is as unknown as any other. */
const factorsOfKind = new Map(
  Object.entries(factors).map(([kind, table]) => [kind, new Map<string, number>(Object.entries(table))]),
);

/**
 * How much of the canonical unit one unit of this UCUM code is; null for a code that does not measure this kind of
 * quantity. Codes are case-sensitive. `unitFactor('kermaAreaProduct', 'uGy.m2')` is 0.01.
 */
export function unitFactor(kind: QuantityKind, ucumCode: string): number | null {
  const bare = ucumCode.includes('{') ? ucumCode.replace(/\{[^{}]*\}/g, '') : ucumCode;
  return factorsOfKind.get(kind)?.get(bare) ?? null;
}
