/** A failure told to the person at the keyboard: the message is the whole output, without a stack. */
export class Refusal extends Error {}
