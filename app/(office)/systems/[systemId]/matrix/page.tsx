import type { Metadata } from "next";
import { may } from "@/app/frame";
import { MatrixEditor } from "@/components/matrix/matrix-editor";
import { getMatrix } from "@/lib/services/sequences/get-matrix";
import { read } from "@/lib/web/page";

export const metadata: Metadata = { title: "Matrix" };

export default async function MatrixPage({ params, searchParams }: PageProps<"/systems/[systemId]/matrix">) {
  const { systemId } = await params;
  const { version } = await searchParams;
  const matrix = await read(getMatrix, { systemId, version });
  const number = matrix.version?.number ?? 0;
  return (
    <MatrixEditor
      key={number}
      systemId={systemId}
      matrix={matrix}
      mayChange={number === matrix.newest && (await may("system:write"))}
    />
  );
}
