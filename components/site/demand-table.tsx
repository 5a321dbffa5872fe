import { Quantity } from "@/components/ui/quantity";
import { Table, TableBody, TableHead, Td, Th } from "@/components/ui/table";
import { sentence, USE_LABELS } from "@/lib/domain/labels";
import type { AreaDetail } from "@/lib/schemas/views/register";

/** Working and peak case of each use: common practice unless the group has agreed otherwise. */
export function DemandTable({ demand }: { demand: AreaDetail["demand"] }) {
  return (
    <Table caption="Working and peak load by use">
      <TableHead>
        <tr>
          <Th>Use</Th>
          <Th className="text-right">Working</Th>
          <Th className="text-right">Peak</Th>
          <Th className="text-right">Check every</Th>
        </tr>
      </TableHead>
      <TableBody>
        {demand.map((row) => (
          <tr key={row.use}>
            <Th scope="row">{sentence(USE_LABELS[row.use])}</Th>
            <Td numeric>
              <Quantity value={row.workingKn} unit="kN" digits={1} />
            </Td>
            <Td numeric>
              <Quantity value={row.peakKn} unit="kN" digits={1} />
              {row.peakStrengthOnly ? <span className="block text-sm text-muted">strength only</span> : null}
            </Td>
            <Td numeric>
              <Quantity value={row.checkIntervalMonths} unit="months" />
            </Td>
          </tr>
        ))}
      </TableBody>
    </Table>
  );
}
