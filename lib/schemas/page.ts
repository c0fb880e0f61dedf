import { z } from 'zod';

/** Query of a list: `cursor` is the `next` of the page before. */
export const pageQuerySchema = z.object({
  cursor: z.string().max(200).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type PageQuery = z.infer<typeof pageQuerySchema>;

/** A list answer; `next` is null on the last page. */
export const pageOf = <S extends z.ZodType>(item: S) => z.object({ items: z.array(item), next: z.string().nullable() });

export interface Page<T> {
  readonly items: readonly T[];
  readonly next: string | null;
}
