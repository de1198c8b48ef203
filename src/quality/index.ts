export { flagSamples, QUALITY_FLAG } from "./flag-samples.ts";
