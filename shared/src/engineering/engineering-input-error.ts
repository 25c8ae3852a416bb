/**
 * An input that no formula can use. `field` is the input's own name (dots and brackets for a nested one:
 * `layers[1].thicknessIn`), so a form can put the sentence beside the right box.
 */
export class EngineeringInputError extends Error {
  readonly field: string

  constructor({ field, message }: { field: string; message: string }) {
    super(message)
    this.name = 'EngineeringInputError'
    this.field = field
  }
}
