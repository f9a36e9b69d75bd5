import { z } from 'zod';
import { garmentKinds, type Garment } from '../../../shared/contract/garment';

export const garmentFilterSchema = z.object({
  kind: z.enum(['any', ...garmentKinds]).default('any'),
  state: z.enum(['in-service', 'out', 'any']).default('in-service'),
  due: z.enum(['any', 'overdue', 'undated']).default('any'),
});
export type GarmentFilter = z.output<typeof garmentFilterSchema>;

export const findGarments = (garments: readonly Garment[], filter: GarmentFilter): Garment[] =>
  garments.filter(
    (garment) =>
      (filter.kind === 'any' || garment.kind === filter.kind) &&
      (filter.state === 'any' || (garment.state === 'in-service') === (filter.state === 'in-service')) &&
      (filter.due === 'any' || (filter.due === 'overdue' ? garment.isOverdue : garment.nextDueOn === null)),
  );
