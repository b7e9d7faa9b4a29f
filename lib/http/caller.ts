import "server-only";
import { env } from "@/lib/env";
import { clientAddress } from "./client-address";
import { peerHeader } from "./incoming-requests";

/** Who asks. Without a key it is an address and no more. */
export interface Caller {
  kind: "anonymous";
  address: string;
}

/** Who may use a route. */
export type Access = "anyone";

export function authenticate(request: Request, _access: Access): Caller {
  const { headers } = request;
  return {
    kind: "anonymous",
    address: clientAddress({ forwarded: headers.get("x-forwarded-for"), peer: headers.get(peerHeader) ?? "", proxies: env.TRUST_PROXY }),
  };
}
