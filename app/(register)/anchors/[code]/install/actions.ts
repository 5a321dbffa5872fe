"use server";

import { revalidatePath } from "next/cache";
import { commandContext } from "@/lib/commands/context";
import { logInstall, logInstallSeries } from "@/lib/commands/log-install";
import { action } from "@/lib/http/action";
import { judgeChoice } from "@/lib/queries/judge-choice";
import { logInstallInput } from "@/lib/schemas/bolt";
import { choiceInput } from "@/lib/schemas/choice";
import { formInput } from "@/lib/schemas/form-input";
import { seriesForm } from "@/lib/schemas/series";

export const judgeType = action(
  formInput(choiceInput),
  ({ input, actor, now }) => judgeChoice(actor, input, now),
  {
    limit: "verdict-address",
  },
);

export const storeInstall = action(formInput(logInstallInput), async ({ input, ...door }) => {
  const done = await logInstall(commandContext(door), input);
  revalidatePath("/", "layout");
  return { id: done.id };
});

export const storeSeries = action(seriesForm, async ({ input, ...door }) => {
  const { bolts } = await logInstallSeries(commandContext(door), input);
  revalidatePath("/", "layout");
  return { id: bolts[0]?.id ?? "" };
});
