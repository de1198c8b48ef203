export { integrateOde } from "./integrate-ode.ts";
export { failed, type Issue, type Outcome, type Severity, succeeded } from "./issue.ts";
export { isToolError, ToolError, type ToolErrorTag } from "./tool-error.ts";
