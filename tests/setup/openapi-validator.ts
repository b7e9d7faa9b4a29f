import Ajv, { type ValidateFunction } from "ajv";
import addFormats from "ajv-formats";
import document from "@/api-spec/openapi.json";

const ajv = new Ajv({ allErrors: true, strict: false });
addFormats(ajv);
ajv.addSchema(document, "document");

const known = new Map<string, ValidateFunction>();

/** Holds a value to a component of the checked-in document: every fault in words, or none. */
export function validatorOf(reference: string): (value: unknown) => string[] {
  const validate = known.get(reference) ?? ajv.compile({ $ref: `document${reference}` });
  known.set(reference, validate);
  return (value) => (validate(value) ? [] : (validate.errors ?? []).map(({ instancePath, message, params }) => `${instancePath} ${message} ${JSON.stringify(params)}`));
}
