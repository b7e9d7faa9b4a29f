/** Every address under /api that is no route. */
export {
  unknownAddress as DELETE,
  unknownAddress as GET,
  unknownAddress as HEAD,
  unknownAddress as OPTIONS,
  unknownAddress as PATCH,
  unknownAddress as POST,
  unknownAddress as PUT,
} from "@/lib/http/unknown-address";
