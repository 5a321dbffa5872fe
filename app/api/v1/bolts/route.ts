import { commandContext } from "@/lib/commands/context";
import { logInstall } from "@/lib/commands/log-install";
import { createdAnswer } from "@/lib/http/created";
import { route } from "@/lib/http/route";
import { logInstallInput } from "@/lib/schemas/bolt";

export const POST = route(
  { body: logInstallInput, signedIn: true, limit: "write-person" },
  async ({ body, ...from }) => createdAnswer("/api/v1/bolts", await logInstall(commandContext(from), body)),
);
