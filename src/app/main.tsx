import { render } from "preact";
import { App } from "./parts/app.tsx";
import { keepSaved, restore } from "./saving.ts";
import { keepSolved } from "./solving.ts";

await restore();
keepSaved();
keepSolved();
render(<App />, document.getElementById("page")!);
