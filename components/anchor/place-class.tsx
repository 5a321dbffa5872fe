import { Table, TableBody, Td, Th } from "@/components/ui/table";
import type { PlaceClassView } from "@/lib/schemas/views/common";
import { MINUS } from "@/lib/shared/format";

/** The corrosion class of the place as a sum anybody can check against the standard. */
export function PlaceClass({ placeClass }: { placeClass: PlaceClassView | null }) {
  if (placeClass === null) {
    return (
      <p className="text-muted">The class of the place is not known while the distance to the sea is not.</p>
    );
  }
  const parts = [
    { sign: "F1", name: "salt from sea or road", value: placeClass.f1 },
    { sign: "F2", name: "sulphur dioxide", value: placeClass.f2 },
    { sign: "F3", name: "washing", value: placeClass.f3 },
  ];
  return (
    <div className="grid gap-1">
      <Table caption="Corrosion resistance class of the place">
        <TableBody>
          {parts.map(({ sign, name, value }) => (
            <tr key={sign}>
              <Th scope="row" className="w-14 py-1.5 type-figure">
                {sign}
              </Th>
              <Td className="py-1.5">{name}</Td>
              <Td numeric className="py-1.5">
                {signed(value)}
              </Td>
            </tr>
          ))}
          <tr className="border-t-2 border-frame">
            <Th scope="row" className="py-1.5 type-figure">
              CRF
            </Th>
            <Td className="py-1.5">
              their sum: stainless steel of class <strong>{placeClass.crc}</strong> or better
            </Td>
            <Td numeric className="py-1.5 text-lg">
              {signed(placeClass.crf)}
            </Td>
          </tr>
        </TableBody>
      </Table>
      <p className="text-sm text-muted">EN 1993-1-4, Annex A. Stress corrosion is a rule of its own.</p>
    </div>
  );
}

function signed(value: number): string {
  if (value === 0) return "0";
  return value < 0 ? `${MINUS}${Math.abs(value)}` : `+${value}`;
}
