import { readingJobs, stopReading } from "../reading-queue.ts";

/** Files that are being read or wait for their turn, each with a way to stop it. */
export function ReadingJobs() {
  return (
    <div role="status">
      {readingJobs.value.map((job, k) => (
        <p key={job.number} class="job">
          <span>
            {k === 0 ? "Reading" : "Waiting:"} {job.fileName}
            {job.doneFrac === null ? "" : ` ${Math.floor(job.doneFrac * 100)} %`}
          </span>{" "}
          <button
            type="button"
            class="small"
            aria-label={`Stop reading ${job.fileName}`}
            onClick={() => stopReading(job)}
          >
            Stop
          </button>
        </p>
      ))}
    </div>
  );
}
