/** Why something cannot go on, in a sentence for whoever started the program; no stack is of use to them. */
export class Refusal extends Error {}
