import { z } from 'zod';

export const signInSchema = z.object({
	email: z.email('Write a whole e-mail address, such as name@example.org.').max(254),
	password: z.string().min(1, 'Write your password.').max(256, 'No password here is that long.')
});
