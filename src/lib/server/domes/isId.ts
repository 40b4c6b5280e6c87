import { z } from 'zod';

const idSchema = z.uuid();

/** Whether an id from an address or a form can be one; PostgreSQL refuses others with an error. */
export const isId = (id: string): boolean => idSchema.safeParse(id).success;
