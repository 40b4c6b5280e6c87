/** What a mail is for. Names a row and never holds a token: see `secretTokens.ts`. */
export type Letter =
	| { kind: 'invitation'; id: string }
	| { kind: 'reset'; id: string }
	/** `until`: when its link is over, in ms since 1970; a letter held up so long is not sent. */
	| { kind: 'sign-in'; id: string; email: string; next: string; until: number };

/** The same letter has the same key, however often its job is tried. */
export const letterKey = ({ kind, id }: Letter): string => `${kind}:${id}`;
