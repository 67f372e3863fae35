"use client";

import { createContext } from "react";
import type { FormState } from "@/lib/domain/shared/form-state";

export const FormStateContext = createContext<FormState>({ ok: false });
