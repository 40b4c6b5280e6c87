/** The page lives in its browser alone: it must come up the same whether the server knows it or not. */
export const ssr = false;
