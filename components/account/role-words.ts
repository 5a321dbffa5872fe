import { type Role, ROLES } from "@/lib/shared/actor";

/** What each role adds, in words. */
export const ROLE_MEANS: Record<Role, string> = {
  rigger: "Sees every site of the area, private notes and reports; prints and exports.",
  bolter: "Also logs installs, adds and corrects anchors, does rebolt jobs.",
  steward: "Also runs the queue, decides conditions, answers reports, says who belongs here.",
};

export const ROLE_CHOICES = ROLES.map((role) => ({ value: role, label: role }));
