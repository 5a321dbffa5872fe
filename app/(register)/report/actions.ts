"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { fileReport } from "@/lib/commands/file-report";
import { action } from "@/lib/http/action";
import { formInput } from "@/lib/schemas/form-input";
import { fileReportInput } from "@/lib/schemas/report";

export const sendReport = action(
  formInput(fileReportInput),
  async ({ input, ...door }) => {
    const filed = await fileReport(commandContext(door), input);
    revalidatePath("/", "layout");
    return { id: filed.id };
  },
  { limit: "report-person" },
);
