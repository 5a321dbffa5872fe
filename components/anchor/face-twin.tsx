import { faceTwin } from "@/components/anchor/face-twin-words";
import type { FaceInput } from "@/components/anchor/face-input";
import { Disclosure } from "@/components/ui/disclosure";

/** The drawing in words, for those who cannot see it and for those who want to read the numbers. */
export function FaceTwin({ input }: { input: FaceInput }) {
  return (
    <Disclosure summary="The drawing in words" className="no-print mt-2">
      <dl className="grid gap-2 text-sm">
        {faceTwin(input).map(({ name, words }) => (
          <div key={name} className="grid gap-x-3 sm:grid-cols-[8rem_1fr]">
            <dt className="pt-0.5 type-label text-muted">{name}</dt>
            <dd>{words}</dd>
          </div>
        ))}
      </dl>
    </Disclosure>
  );
}
