import type * as schema from "@/db/schema";
import { ADHESIVES, type AdhesiveKey } from "@/db/seed/catalogue/adhesives";
import { BOLT_TYPES, boltType, type TypeKey } from "@/db/seed/catalogue/bolt-types";
import { WEBBINGS } from "@/db/seed/catalogue/webbings";
import { type Calendar, eveningOf } from "@/db/seed/dates";
import { Ids } from "@/db/seed/ids";
import { type PersonIds, personIds, personName, REGISTER_OPENED } from "@/db/seed/people";
import type { AnchorSpec, BoltSpec, Entered, PlacementSpec } from "@/db/seed/spec";

type Row<T extends keyof typeof schema> = (typeof schema)[T] extends { $inferInsert: infer R } ? R : never;

/** Everything the seed will write, table by table, in memory first. */
export class Book {
  readonly ids = new Ids("tarrow ids");
  readonly people: PersonIds;
  readonly areas: Row<"areas">[] = [];
  readonly sites: Row<"sites">[] = [];
  readonly boltTypes: Row<"boltTypes">[] = [];
  readonly adhesives: Row<"adhesives">[] = [];
  readonly webbings: Row<"webbings">[] = [];
  readonly anchors: Row<"anchors">[] = [];
  readonly rockBodies: Row<"rockBodies">[] = [];
  readonly placements: Row<"placements">[] = [];
  readonly edges: Row<"edges">[] = [];
  readonly fittings: Row<"fittings">[] = [];
  readonly bolts: Row<"bolts">[] = [];
  readonly pullTests: Row<"pullTests">[] = [];
  readonly spans: Row<"spans">[] = [];
  readonly spanRigs: Row<"spanRigs">[] = [];
  readonly kits: Row<"kits">[] = [];
  readonly lineLog: Row<"lineLog">[] = [];
  readonly closures: Row<"closures">[] = [];
  readonly batchWarnings: Row<"batchWarnings">[] = [];
  readonly reports: Row<"reports">[] = [];
  readonly reboltJobs: Row<"reboltJobs">[] = [];
  readonly reboltJobPlacements: Row<"reboltJobPlacements">[] = [];
  readonly reboltJobAssignees: Row<"reboltJobAssignees">[] = [];
  readonly watches: Row<"watches">[] = [];
  readonly events: Row<"events">[] = [];
  readonly entered: Entered[] = [];
  private readonly typeIds = new Map<TypeKey, string>();
  private readonly adhesiveIds = new Map<AdhesiveKey, string>();
  private readonly anchorCounts = new Map<string, number>();

  constructor(readonly calendar: Calendar) {
    this.people = personIds(this.ids);
    this.enterCatalogue();
  }

  typeId(key: TypeKey): string {
    return found(this.typeIds.get(key), key);
  }

  adhesiveId(key: AdhesiveKey): string {
    return found(this.adhesiveIds.get(key), key);
  }

  /** Who wrote a row, when, in the audit columns. */
  by(at: Date, person: keyof PersonIds = "steward") {
    return { createdAt: at, createdBy: this.people[person], updatedAt: at, updatedBy: this.people[person] };
  }

  anchorNamed(label: string): Entered {
    return found(
      this.entered.find((anchor) => anchor.label === label),
      label,
    );
  }

  /** Enters an anchor with all that belongs to it. `prefix` starts its code: `GC` gives GC-01, GC-02… */
  anchor(site: { id: string; areaId: string; prefix: string }, spec: AnchorSpec): Entered {
    const since = firstDay(spec);
    const id = this.ids.at(since);
    const number = (this.anchorCounts.get(site.prefix) ?? 0) + 1;
    this.anchorCounts.set(site.prefix, number);
    this.anchors.push({
      id,
      siteId: site.id,
      label: spec.label,
      code: `${site.prefix}-${String(number).padStart(2, "0")}`,
      uses: spec.uses,
      point: spec.at,
      pointErrorM: 3,
      ...spec.facts,
      ...this.by(since),
    });
    const bodyIds = (spec.bodies ?? []).map((body) => {
      const bodyId = this.ids.at(since);
      this.rockBodies.push({ id: bodyId, anchorId: id, ...body, ...this.by(since) });
      return bodyId;
    });
    for (const edge of spec.edges ?? []) {
      this.edges.push({ id: this.ids.at(since), anchorId: id, ...edge, ...this.by(since) });
    }
    const placed = spec.placements.map((placement, index) =>
      this.placement(id, since, index + 1, placement, bodyIds),
    );
    const fittingIds = (spec.fittings ?? []).map(({ on, ...fitting }) => {
      const fittingId = this.ids.at(since);
      const placementId = placed.find((each) => each.number === on)?.id ?? null;
      this.fittings.push({ id: fittingId, anchorId: id, placementId, ...fitting, ...this.by(since) });
      return fittingId;
    });
    const entered = { ...spec, id, siteId: site.id, areaId: site.areaId, placements: placed, fittingIds };
    this.entered.push(entered);
    return entered;
  }

  private placement(
    anchorId: string,
    since: Date,
    number: number,
    spec: PlacementSpec,
    bodyIds: readonly string[],
  ): Entered["placements"][number] {
    const id = this.ids.at(since);
    const [xMm = null, yMm = null, zMm = null] = spec.at ?? [];
    const chain = spec.bolts ?? [];
    const last = chain.at(-1);
    const hole = last?.type ? (boltType(last.type).holeDiameterMm ?? null) : null;
    const deep = last?.facts?.embedmentMm ?? null;
    this.placements.push({
      id,
      anchorId,
      number,
      xMm,
      yMm,
      zMm,
      holeDiameterMm: hole,
      holeDepthMm: hole === null || deep === null ? null : deep + 8,
      rockBodyId: spec.body === undefined ? null : (bodyIds[spec.body] ?? null),
      ...spec.facts,
      ...this.by(since),
    });
    const boltIds = chain.reduce<string[]>(
      (before, bolt) => [...before, this.bolt(id, bolt, before.at(-1) ?? null)],
      [],
    );
    const inForce =
      last !== undefined && last.facts?.removedOn === undefined ? (boltIds.at(-1) ?? null) : null;
    return { id, number, boltId: inForce, chain: boltIds };
  }

  private bolt(placementId: string, spec: BoltSpec, replacesBoltId: string | null): string {
    const since = recordedOn(spec);
    const id = this.ids.at(since);
    const facts = spec.facts ?? {};
    const gone = facts.removedOn !== undefined;
    this.bolts.push({
      id,
      placementId,
      boltTypeId: spec.type === null ? null : this.typeId(spec.type),
      form: spec.form ?? (spec.type === null ? "expansion_stud_hanger" : boltType(spec.type).form),
      installedOn: spec.when?.on ?? null,
      installedOnPrecision: spec.when?.precision ?? "day",
      adhesiveId: spec.glue === undefined ? null : this.adhesiveId(spec.glue),
      installedBy: spec.hand === undefined ? null : personName(spec.hand),
      installedByUserId: spec.hand === undefined ? null : this.people[spec.hand],
      replacesBoltId,
      ...facts,
      ...this.by(since, spec.hand),
      condition: gone ? "removed" : "in_service",
      derivedCondition: gone ? "removed" : "in_service",
    });
    return id;
  }

  private enterCatalogue(): void {
    const admin = this.by(REGISTER_OPENED, "admin");
    for (const key of keysOf(BOLT_TYPES)) {
      const id = this.ids.at(REGISTER_OPENED);
      this.typeIds.set(key, id);
      this.boltTypes.push({ id, ...boltType(key), ...admin });
    }
    for (const key of keysOf(ADHESIVES)) {
      const id = this.ids.at(REGISTER_OPENED);
      const adhesive = ADHESIVES[key];
      this.adhesiveIds.set(key, id);
      this.adhesives.push({ id, ...adhesive, cureSteps: [...adhesive.cureSteps], ...admin });
    }
    for (const webbing of Object.values(WEBBINGS)) {
      this.webbings.push({ id: this.ids.at(REGISTER_OPENED), ...webbing, ...admin });
    }
  }
}

/** The evening it was placed, or the opening of the register for what was there before. */
function recordedOn(bolt: BoltSpec): Date {
  const placed = bolt.when === null ? REGISTER_OPENED : eveningOf(bolt.when.on);
  return placed < REGISTER_OPENED ? REGISTER_OPENED : placed;
}

/** An anchor is as old in the register as the first thing recorded at it. */
function firstDay(spec: AnchorSpec): Date {
  const days = spec.placements.flatMap(({ bolts = [] }) => bolts.map(recordedOn));
  return days.reduce((first, day) => (day < first ? day : first), days[0] ?? REGISTER_OPENED);
}

function keysOf<T extends object>(record: T): Extract<keyof T, string>[] {
  const isKey = (key: string): key is Extract<keyof T, string> => key in record;
  return Object.keys(record).filter(isKey);
}

function found<T>(value: T | undefined, name: string): T {
  if (value === undefined) throw new Error(`The seed names "${name}", which it never entered.`);
  return value;
}
