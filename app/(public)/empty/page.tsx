/** Shows nothing and asks for nothing: what measurements of other pages are divided by. */
export const dynamic = "force-dynamic";

export default function EmptyPage() {
  return null;
}
