"use client";

import { Printer } from "lucide-react";
import { Button } from "@/components/ui/button";

export const PrintButton = ({ children }: { children: React.ReactNode }) => (
  <Button data-print="off" onClick={() => window.print()}>
    <Printer aria-hidden className="size-4" />
    {children}
  </Button>
);
