/** What a signed-in person may do. One table, read by the server's guards and by the page alike. */

export const roles = [
  'technologist',
  'physicist',
  'interventionalist',
  'committee',
  'administrator',
] as const;
export type Role = (typeof roles)[number];

export const roleNames: Record<Role, string> = {
  technologist: 'technologist',
  physicist: 'medical physicist',
  interventionalist: 'interventionalist',
  committee: 'committee member',
  administrator: 'administrator',
};

/** Everyone who signs in is also a monitored person: own exposure, own garments. */
type Holder = Role | 'monitored';

/**
 * How far a permission reaches.
 * `all`: every record. `by-job`: every record, people by job title only (one's own row named).
 * `masked`: figures without people and patients. `own`: records that name the person.
 */
export const scopes = ['own', 'masked', 'by-job', 'all'] as const;
export type Scope = (typeof scopes)[number];

type Grant = Partial<Record<Holder, Scope>>;

const grants = {
  'procedure.list': { technologist: 'all', physicist: 'all', interventionalist: 'own' },
  'procedure.read': { technologist: 'all', physicist: 'all', interventionalist: 'own' },
  'procedure.read-patient': { technologist: 'all', physicist: 'all', interventionalist: 'own' },
  'procedure.complete': { technologist: 'all', physicist: 'all' },
  'procedure.classify': { physicist: 'all' },
  'procedure.regroup': { physicist: 'all' },
  'procedure.enter-by-hand': { technologist: 'all', physicist: 'all' },
  'data-check.settle': { physicist: 'all' },
  'data-check.list': { physicist: 'all', administrator: 'all' },
  'data-check.edit': { physicist: 'all' },
  'procedure.read-exposure': {
    technologist: 'by-job',
    physicist: 'all',
    interventionalist: 'own',
    monitored: 'own',
  },
  'dose-report.receive': { technologist: 'all', physicist: 'all' },
  'dose-report.list': { technologist: 'all', physicist: 'all', administrator: 'masked' },
  'dose-report.decide': { physicist: 'all' },
  'dose-report.download': { technologist: 'all', physicist: 'all' },
  'staff-exposure.read': {
    technologist: 'own',
    physicist: 'all',
    interventionalist: 'own',
    committee: 'masked',
    monitored: 'own',
  },
  'garment.list': {
    technologist: 'all',
    physicist: 'all',
    interventionalist: 'own',
    committee: 'masked',
    administrator: 'all',
    monitored: 'own',
  },
  'garment.edit': { technologist: 'all', physicist: 'all', administrator: 'all' },
  'person.choose': { technologist: 'all', physicist: 'all', administrator: 'all' },
  'person.edit': { administrator: 'all' },
  'room.list': {
    technologist: 'all',
    physicist: 'all',
    interventionalist: 'all',
    committee: 'all',
    administrator: 'all',
  },
  'room.edit': { administrator: 'all' },
  'equipment.edit': { administrator: 'all', physicist: 'all' },
  'procedure-type.list': {
    technologist: 'all',
    physicist: 'all',
    interventionalist: 'all',
    committee: 'all',
    administrator: 'all',
  },
  'procedure-type.edit': { physicist: 'all', administrator: 'all' },
  'calibration.edit': { physicist: 'all', administrator: 'all' },
  'audit.read': { administrator: 'masked' },
  'methods.read': {
    technologist: 'all',
    physicist: 'all',
    interventionalist: 'all',
    committee: 'all',
    administrator: 'all',
    monitored: 'all',
  },
} as const satisfies Record<string, Grant>;

export type Action = keyof typeof grants;
export const actions = Object.keys(grants) as Action[];

export type Actor = { id: string; roles: readonly Role[] };

/** The widest scope that any of the person's roles gives for an action, null when none does. */
export function scopeOf(actor: Actor, action: Action): Scope | null {
  const grant: Grant = grants[action];
  const held = [...actor.roles, 'monitored' as const].flatMap((holder) => grant[holder] ?? []);
  return scopes.findLast((scope) => held.includes(scope)) ?? null;
}

/** May this person do it, and to this record? A record is one's own when it names the person. */
export function can(actor: Actor, action: Action, record?: { isOwn: boolean }): boolean {
  const scope = scopeOf(actor, action);
  if (scope === null) return false;
  return scope === 'own' && record ? record.isOwn : true;
}
