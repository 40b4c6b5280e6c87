/** What a mail is for. Names a row and never holds a token: see `secretTokens.ts`. */
export type Letter =
	| { kind: 'invitation'; id: string }
	| { kind: 'reset'; id: string }
	| { kind: 'sign-in'; id: string; email: string; next: string };

/** The same letter has the same key, however often its job is tried. */
export const letterKey = ({ kind, id }: Letter): string => `${kind}:${id}`;
