/** An answer whose version is not part of its body. */
export class Versioned<View> {
  constructor(
    readonly version: number,
    readonly view: View,
  ) {}
}
