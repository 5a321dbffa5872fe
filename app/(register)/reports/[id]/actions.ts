"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { handleReport } from "@/lib/commands/handle-report";
import { action } from "@/lib/http/action";
import { handleReportForm } from "@/lib/schemas/report";

export const answerReport = action(
  handleReportForm,
  async ({ input: { id, version, ...answer }, ...door }) => {
    await handleReport(commandContext(door), { id, version, answer });
    revalidatePath("/", "layout");
  },
);
