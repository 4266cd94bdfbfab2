import { LockKeyhole, PencilLine } from "lucide-react";
import { Tag } from "@/components/ui/tag";
import type { RoundState } from "@/lib/rounds/schema";

export function RoundStateTag({ state }: { state: RoundState }) {
  switch (state) {
    case "draft":
      return (
        <Tag tone="mute" icon={PencilLine}>
          draft
        </Tag>
      );
    case "open":
      return (
        <Tag tone="own" icon={LockKeyhole}>
          open, sealed
        </Tag>
      );
    case "closed":
      return <Tag tone="info">closed</Tag>;
    case "released":
      return <Tag tone="ok">released</Tag>;
  }
}
