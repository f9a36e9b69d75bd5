import { z } from 'zod';

export const idSchema = z.uuid();

/** Local wall-clock time, with an offset only where one is known. */
export const localDateTimeSchema = z.iso.datetime({ local: true, offset: true });

export const calendarDateSchema = z.iso.date();

/** An empty form field means "not given". */
export const optionalText = (max: number) =>
  z
    .string()
    .trim()
    .max(max)
    .nullish()
    .transform((text) => text || null);

export const requiredText = (max: number) => z.string().trim().min(1, 'Fill this in.').max(max);

/** Optimistic lock: the version that the person saw. */
export const versionSchema = z.int().min(1);

export const namedSchema = z.object({ id: idSchema, name: z.string() });

/** A nominal value with its about-95-% interval. */
export const estimatedSchema = z.object({ nominal: z.number(), low: z.number(), high: z.number() });
export type Estimated = z.infer<typeof estimatedSchema>;

export const remarkSchema = z.object({ code: z.string(), detail: z.string() });
export type Remark = z.infer<typeof remarkSchema>;

export const listOf = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item) });
