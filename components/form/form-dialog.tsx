"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog, DialogActions, DialogContent, DialogTrigger } from "@/components/ui/dialog";
import { Form, type FormAction, SubmitButton } from "./form";

type FormDialogProps = {
  action: FormAction;
  /** The word on the button that opens it; `aside` tells buttons of the same word apart. */
  button: string;
  aside?: string;
  title: string;
  description?: React.ReactNode;
  /** The verb itself. */
  submit: string;
  look?: "quiet" | "plain" | "danger" | "primary";
  /** What the form posts beside its fields. */
  hidden?: Record<string, string>;
  children?: React.ReactNode;
};

/** A small form behind a button: it closes when it worked, and stays with what was typed when it did not. */
export function FormDialog({
  action,
  button,
  aside,
  title,
  description,
  submit,
  look = "quiet",
  hidden = {},
  children,
}: FormDialogProps) {
  const [open, setOpen] = useState(false);
  return (
    <Dialog open={open} onOpenChange={setOpen}>
      <DialogTrigger asChild>
        <Button size="small" variant={look} data-print="off">
          {button}
          {aside && <span className="sr-only"> {aside}</span>}
        </Button>
      </DialogTrigger>
      <DialogContent title={title} description={description}>
        <Form action={action} say="toast" onDone={() => setOpen(false)} className="relative grid gap-4">
          {Object.entries(hidden).map(([name, value]) => (
            <input key={name} type="hidden" name={name} value={value} />
          ))}
          {children}
          <DialogActions>
            <SubmitButton variant={look === "danger" ? "danger" : "primary"}>{submit}</SubmitButton>
          </DialogActions>
        </Form>
      </DialogContent>
    </Dialog>
  );
}
