/** A body that must be JSON and hold nothing. */
export class EmptyDto {}
