import { Actions } from "./actions";
import { Fields } from "./fields";
import { Layers } from "./layers";
import { Told } from "./told";

/** `theme` keeps names of radio groups apart, since both themes stand on one page. */
export function Specimens({ theme }: { theme: string }) {
  return (
    <>
      <Actions />
      <Fields theme={theme} />
      <Layers />
      <Told />
    </>
  );
}
