"use client";

import { Button } from "@/components/ui/button";
import type { View } from "@/lib/auth/view";
import { useTakeView } from "./use-take-view";

export function SwitchButton({ view, label }: { view: View; label: string }) {
  const takeView = useTakeView();
  return (
    <Button kind="main" onClick={() => takeView(view)}>
      {label}
    </Button>
  );
}
