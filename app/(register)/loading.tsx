import { Spinner } from "@/components/ui/spinner";

export default function Loading() {
  return (
    <div className="grid min-h-[50vh] place-items-center" role="status">
      <span className="flex items-center gap-3 text-muted">
        <Spinner /> Reading the register…
      </span>
    </div>
  );
}
