import type { LoadPolicy } from "@/lib/domain/policy";
import type { AnchorQuestion, BoltEvidence } from "@/lib/domain/finding/evidence";
import type { Rule } from "@/lib/domain/finding/types";
import { careClosure } from "@/lib/domain/finding/rules/care-closure";
import { careOverdue } from "@/lib/domain/finding/rules/care-overdue";
import { careReportOpen } from "@/lib/domain/finding/rules/care-report-open";
import { eyeRadius } from "@/lib/domain/finding/rules/eye-radius";
import { fittingWear } from "@/lib/domain/finding/rules/fitting-wear";
import { loadBend } from "@/lib/domain/finding/rules/load-bend";
import { loadOneLost } from "@/lib/domain/finding/rules/load-one-lost";
import { loadStrength } from "@/lib/domain/finding/rules/load-strength";
import { loadUnknown } from "@/lib/domain/finding/rules/load-unknown";
import { metalClass } from "@/lib/domain/finding/rules/metal-class";
import { metalMixed } from "@/lib/domain/finding/rules/metal-mixed";
import { metalPlated } from "@/lib/domain/finding/rules/metal-plated";
import { metalStressCorrosion } from "@/lib/domain/finding/rules/metal-stress-corrosion";
import { metalUnknown } from "@/lib/domain/finding/rules/metal-unknown";
import { recordEmpty } from "@/lib/domain/finding/rules/record-empty";
import { recordCuring } from "@/lib/domain/finding/rules/record-curing";
import { recordGlueExpired } from "@/lib/domain/finding/rules/record-glue-expired";
import { recordMissing } from "@/lib/domain/finding/rules/record-missing";
import { recordStandard } from "@/lib/domain/finding/rules/record-standard";
import { recordWarning } from "@/lib/domain/finding/rules/record-warning";
import { rockEdge } from "@/lib/domain/finding/rules/rock-edge";
import { rockEmbedment } from "@/lib/domain/finding/rules/rock-embedment";
import { rockHold } from "@/lib/domain/finding/rules/rock-hold";
import { rockMethod } from "@/lib/domain/finding/rules/rock-method";
import { rockOneBody } from "@/lib/domain/finding/rules/rock-one-body";
import { rockSpacing } from "@/lib/domain/finding/rules/rock-spacing";

/** The rules about one bolt. Each decides for itself when it speaks. */
export const BOLT_RULES: readonly Rule<BoltEvidence, LoadPolicy>[] = [
  loadBend,
  loadStrength,
  loadUnknown,
  metalClass,
  metalStressCorrosion,
  metalPlated,
  metalMixed,
  metalUnknown,
  rockEmbedment,
  rockSpacing,
  rockEdge,
  rockMethod,
  rockHold,
  eyeRadius,
  recordMissing,
  recordCuring,
  recordGlueExpired,
  recordWarning,
  recordStandard,
  careOverdue,
  careReportOpen,
];

/** The rules about an anchor as a whole, asked once for each of its uses. */
export const ANCHOR_RULES: readonly Rule<AnchorQuestion, LoadPolicy>[] = [
  loadOneLost,
  rockOneBody,
  fittingWear,
  recordEmpty,
  careReportOpen,
  careClosure,
];
