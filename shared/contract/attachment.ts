import { z } from 'zod';
import { idSchema } from './common';

/** Kinds of picture that are taken, told by their content and not by their name. */
export const pictureTypes = ['image/jpeg', 'image/png', 'image/webp'] as const;
export type PictureType = (typeof pictureTypes)[number];

/** A phone's picture at full resolution fits. */
export const largestPictureBytes = 12 * 1_048_576;

export const keptAttachmentSchema = z.object({
  id: idSchema,
  fileName: z.string(),
  mediaType: z.enum(pictureTypes),
  byteCount: z.int(),
});
export type KeptAttachment = z.infer<typeof keptAttachmentSchema>;
