import { expose } from "comlink";
import { readerTasks } from "./reader-tasks.ts";

expose(readerTasks);
