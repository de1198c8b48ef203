import { render } from "preact";
import { keepLayering } from "./layering.ts";
import { App } from "./parts/app.tsx";
import { keepSaved, restore } from "./saving.ts";
import { keepSolved } from "./solving.ts";

await restore();
keepSaved();
keepSolved();
keepLayering();
render(<App />, document.getElementById("page")!);
