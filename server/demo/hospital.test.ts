import { describe, expect, it } from 'vitest';
import { demoGarments } from './garments';
import { findEquipment } from './hospital';
import { demoStaff } from './staff.table-data';

describe('the invented hospital', () => {
  it('has 34 monitored members of staff known by role code only', () => {
    const monitored = demoStaff.filter((member) => member.isMonitored);
    expect(monitored).toHaveLength(34);
    expect(demoStaff.every((member) => /^[A-Z]{1,3}-\d{1,2}$/.test(member.code))).toBe(true);
  });

  it('has 64 garments, five of them overdue, and an apron in service for everybody with a badge', () => {
    expect(demoGarments).toHaveLength(64);
    expect(demoGarments.filter((garment) => (garment.nextDueInDays ?? 0) < 0)).toHaveLength(5);
    const dressed = demoGarments.filter(
      (garment) => ['vest-and-skirt', 'one-piece'].includes(garment.kind) && garment.state === 'in-service',
    );
    const owners = new Set(dressed.map((garment) => garment.ownerCode));
    for (const member of demoStaff.filter((person) => person.isMonitored))
      expect(owners).toContain(member.code);
  });

  it('changes the machine of the second interventional room in month 15', () => {
    expect(findEquipment('IR2', 14).serialNumber).toBe('KX-400-0056');
    expect(findEquipment('IR2', 15).serialNumber).toBe('PW-C9-0009');
  });
});
