import document from "@/api-spec/openapi.json";
import { fixedJson } from "@/lib/http/fixed-json";
import { otherMethods } from "@/lib/http/other-methods";

export const GET = fixedJson(document);
export const { POST, HEAD, PUT, PATCH, DELETE, OPTIONS } = otherMethods({ GET });
