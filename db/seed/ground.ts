import type { LonLat } from "@/db/columns/point";
import type { Book } from "@/db/seed/book";
import { ISLAND_CENTRE, ISLAND_EAST_WEST_M, ISLAND_NORTH_SOUTH_M } from "@/db/seed/island/coast";
import { offset, walk } from "@/db/seed/island/frame";
import type { Places } from "@/db/seed/island/places";
import { RIM_ANCHOR_INLAND_M } from "@/db/seed/island/places";
import { REGISTER_OPENED } from "@/db/seed/people";
import type { sites } from "@/db/schema";

/** A site as the stories use it. */
export interface Site {
  id: string;
  areaId: string;
  /** Starts the codes of its anchors. */
  prefix: string;
}

export interface Ground {
  tarrow: string;
  skerry: string;
  gannetCleft: Site;
  undercroft: Site;
  pillarStack: Site;
  lowdenQuarry: Site;
  fellgateWall: Site;
  crownMoor: Site;
  outerSkerry: Site;
}

/** Enters the two areas and their sites. */
export function enterGround(book: Book, at: Places): Ground {
  const tarrow = enterTarrow(book);
  const skerry = enterSkerryArea(book, at);
  const site = (areaId: string, prefix: string, facts: Omit<typeof sites.$inferInsert, "id" | "areaId">) => {
    const id = book.ids.at(REGISTER_OPENED);
    book.sites.push({ id, areaId, so2: "low", ...facts, ...book.by(REGISTER_OPENED) });
    return { id, areaId, prefix };
  };
  return {
    tarrow,
    skerry,
    gannetCleft: site(tarrow, "GC", {
      slug: "gannet-cleft",
      name: "Gannet Cleft",
      point: walk(at.gannetCleft.at, [at.gannetCleft.inlandDeg, 150]),
      summary: "A sea gorge that narrows inland; three lines across it, the surf below.",
      rockType: "dolerite",
      ucsMpa: 100,
      ucsBasis: "ISRM R5 by hammer, lower end",
      washing: "rain",
      approach:
        "Path from the road end over the sheep wall, 25 minutes. The last 200 m are pathless; keep off the turf edge.",
      landPermission: "Common grazing; the graziers' meeting agreed in writing, renewed every three years.",
      noBoltZones: "Nothing below the lichen line on the south rim: storm petrel burrows.",
    }),
    undercroft: site(tarrow, "UC", {
      slug: "the-undercroft",
      name: "The Undercroft",
      visibility: "sensitive",
      point: { lon: at.undercroft.lon, lat: at.undercroft.lat },
      summary: "A sea cave that rain never reaches: the worst place on the island for steel.",
      rockType: "limestone",
      ucsMpa: 60,
      ucsBasis: "point load test on four lumps",
      washing: "none",
      approach: "Shown on the ground by a member. Only at low water in calm weather.",
      landPermission: "By word of mouth with the crofter above; few people at a time, no mention elsewhere.",
      noBoltZones: "The seal ledge at the back.",
    }),
    pillarStack: site(tarrow, "PS", {
      slug: "pillar-stack",
      name: "Pillar Stack",
      point: walk(at.pillarStack.at, [at.pillarStack.inlandDeg, RIM_ANCHOR_INLAND_M]),
      summary: "A sandstone stack 65 m off the rim; one line, and the way down when the line is up.",
      rockType: "sandstone",
      ucsMpa: 25,
      ucsBasis: "ISRM R3 by hammer and knife, lower end",
      washing: "rain",
      approach: "Rim: coast path, 40 minutes. Stack: by boat or swim in a calm, or by the line.",
      landPermission: "Rim: open coast. Stack: foreshore, no owner known.",
      noBoltZones: "Seaward half of the summit while birds nest.",
    }),
    lowdenQuarry: site(tarrow, "LQ", {
      slug: "lowden-quarry",
      name: "Lowden Quarry",
      point: at.lowdenQuarry,
      summary:
        "Old limestone quarry: single pitches, abseils from the tramway, some relics of the first years.",
      rockType: "limestone",
      ucsMpa: 50,
      ucsBasis: "ISRM R4 by hammer, lower end",
      washing: "rain",
      saltedRoadDistanceM: 900,
      approach: "Park at the kiln, ten minutes along the tramway.",
      landPermission: "Parish council; insurance note hangs in the hut.",
      noBoltZones: "The kiln wall and the orchid bank.",
    }),
    fellgateWall: site(tarrow, "FW", {
      slug: "fellgate-wall",
      name: "Fellgate Wall",
      point: at.fellgateWall,
      summary: "Clean granite above the moor road, slabs on the left, two pitches on the right.",
      rockType: "granite",
      ucsMpa: 100,
      ucsBasis: "ISRM R5 by hammer, lower end",
      washing: "rain",
      approach: "From the cattle grid straight up, 15 minutes.",
      landPermission: "Estate; climbing tolerated, no fires, dogs on a lead from March to June.",
    }),
    crownMoor: site(tarrow, "CM", {
      slug: "crown-moor",
      name: "Crown Moor",
      point: at.crownMoor,
      summary:
        "Inland gorge in the middle of the island; a line of 190 m, and the big one of 480 m that stands in the wind.",
      rockType: "rhyolite",
      ucsMpa: 80,
      ucsBasis: "point load test, mean of ten less one deviation",
      washing: "rain",
      approach: "Moor track to the sheepfold, 50 minutes on foot; the east rim needs another 30.",
      landPermission: "Estate; ring the keeper two days before a line goes up, low flying is possible.",
      noBoltZones: "The cairn and 20 m around it.",
    }),
    outerSkerry: site(skerry, "OS", {
      slug: "outer-skerry",
      name: "Outer Skerry",
      point: at.skerry,
      summary: "Landing anchors for the bird counters.",
      rockType: "gneiss",
      ucsMpa: 100,
      ucsBasis: "ISRM R5 by hammer, lower end",
      washing: "rain",
      approach: "By boat.",
      landPermission: "Bird wardens only.",
    }),
  };
}

function enterTarrow(book: Book): string {
  const id = book.ids.at(REGISTER_OPENED);
  book.areas.push({
    id,
    slug: "tarrow",
    name: "Isle of Tarrow",
    summary: "Invented island with invented anchors: the demonstration area.",
    boundary: box(ISLAND_CENTRE, ISLAND_EAST_WEST_M / 2 + 2_000, ISLAND_NORTH_SOUTH_M / 2 + 1_000),
    coast: "other",
    so2: "low",
    timeZone: "Atlantic/Azores",
    contactEmail: "steward@demo.byssus.example",
    emergency: {
      number: "112, ask for Tarrow coast rescue (invented: demonstration data)",
      stretcherAccess:
        "Lowden Quarry and Fellgate Wall: stretcher to the road in 20 minutes. Crown Moor: helicopter or four hours. Pillar Stack: by sea only.",
      signal: "At the quarry hut and on the moor's west rim. None in Gannet Cleft; walk to the sheep wall.",
      meetingPoint: "Old lifeboat house, Tarrow Harbour.",
    },
    ...book.by(REGISTER_OPENED, "admin"),
  });
  return id;
}

function enterSkerryArea(book: Book, at: Places): string {
  const id = book.ids.at(REGISTER_OPENED);
  book.areas.push({
    id,
    slug: "skerry",
    name: "Outer Skerry",
    summary: "Seen by its members only.",
    visibility: "members",
    boundary: box(at.skerry, 600, 600),
    coast: "other",
    so2: "low",
    timeZone: "Atlantic/Azores",
    contactEmail: "steward@demo.byssus.example",
    emergency: {
      number: "112, ask for Tarrow coast rescue (invented: demonstration data)",
      stretcherAccess: "By sea only.",
      signal: null,
      meetingPoint: null,
    },
    ...book.by(REGISTER_OPENED, "admin"),
  });
  return id;
}

/** A rectangle as EWKT. */
function box(centre: LonLat, eastM: number, northM: number): string {
  const low = offset(centre, { eastM: -eastM, northM: -northM });
  const high = offset(centre, { eastM, northM });
  const corners = [
    [low.lon, low.lat],
    [high.lon, low.lat],
    [high.lon, high.lat],
    [low.lon, high.lat],
    [low.lon, low.lat],
  ];
  return `SRID=4326;POLYGON((${corners.map(([lon, lat]) => `${lon?.toFixed(6)} ${lat?.toFixed(6)}`).join(",")}))`;
}
