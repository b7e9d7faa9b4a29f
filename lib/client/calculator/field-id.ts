/** The id of the control with this form name: what an error summary links to. */
export function fieldId(name: string): string {
  return `field-${name.replaceAll(".", "-")}`;
}
