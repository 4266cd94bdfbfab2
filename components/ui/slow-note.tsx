"use client";

import { useEffect, useState } from "react";

const SLOW_AFTER_MS = 8_000;

/** A sentence that appears when waiting has taken long. Its place must be inside a live region. */
export function SlowNote({ text }: { text: string }) {
  const [isSlow, setIsSlow] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setIsSlow(true), SLOW_AFTER_MS);
    return () => clearTimeout(timer);
  }, []);
  return isSlow ? <p className="mt-2 text-small text-ink-2">{text}</p> : null;
}
