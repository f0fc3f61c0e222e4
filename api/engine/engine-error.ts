/** A case that the engine cannot answer: it names the case, and the input at fault when there is one. */
export class EngineError extends Error {
  constructor(
    message: string,
    readonly field?: string,
  ) {
    super(message);
    this.name = 'EngineError';
  }
}
