/** The id of the control of a form path, so that the error summary can lead to it. */
export const fieldId = (name: string): string => `field-${name.replace(/[^\w-]/g, '-')}`
