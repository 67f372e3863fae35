"use client";

import { useState } from "react";
import { FunctionsField } from "@/components/form/functions-field";
import type { SystemFunction } from "@/lib/domain/systems/words";

/** Functions, where nothing else in the form depends on them. */
export function FunctionsChoice({ legend }: { legend: string }) {
  const [value, onChange] = useState<SystemFunction[]>([]);
  return <FunctionsField {...{ legend, value, onChange }} />;
}
