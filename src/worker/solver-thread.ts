import { expose } from "comlink";
import { solverTasks } from "./solver-tasks.ts";

expose(solverTasks);
