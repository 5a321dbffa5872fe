import { v7 } from "uuid";
import { Random } from "@/db/seed/random";

/** UUIDv7 that are the same every time: the record's date and seeded random bits. */
export class Ids {
  private readonly random: Random;

  constructor(word: string) {
    this.random = new Random(word);
  }

  at(date: Date): string {
    return v7({ msecs: date.getTime(), random: this.random.bytes(16) });
  }
}
