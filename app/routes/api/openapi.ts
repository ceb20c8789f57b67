import { openApi } from "~/calc/openapi";
import { publicOrigin } from "~/http/request.server";
import type { Route } from "./+types/openapi";

/** GET /api/v1/openapi.json: the calculations described for programs. Open to anyone: it holds nothing of the shop's. */
export function loader({ request }: Route.LoaderArgs) {
  return Response.json(openApi(publicOrigin(request)));
}
