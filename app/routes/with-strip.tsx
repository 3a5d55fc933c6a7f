// Layout of every page that is text: the strip above, the page below.
import { Outlet } from "react-router";
import { TopStrip } from "~/components/top-strip";
import { useViewer } from "~/components/use-viewer";

export default function WithStrip() {
  return (
    <>
      <TopStrip viewer={useViewer()} />
      <Outlet />
    </>
  );
}
