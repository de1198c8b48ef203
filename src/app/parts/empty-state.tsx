import { loadSample } from "../samples.ts";

/** What the page is for, shown until there is a cast. */
export function EmptyState() {
  return (
    <section class="empty">
      <h2>Pressure in layered water, from the casts you have</h2>
      <p>
        Drop cast files on this page. Each cast becomes a column of density and pressure from the surface to the bed,
        held against the constant-density estimate. Files are read on this machine and go nowhere.
      </p>
      <p class="actions">
        <button type="button" class="primary" onClick={() => void loadSample("estuary")}>
          Load the sample survey
        </button>
        <button type="button" onClick={() => void loadSample("reservoir")}>
          Load the sample reservoir
        </button>
      </p>
      <p class="note">An estuary and a reservoir that exist nowhere: both are invented to try the page with.</p>
      <h3>What a file should contain</h3>
      <ul>
        <li>
          A table with a row of column names, with or without units: CSV or other delimited text, a sheet of a workbook
          (.xlsx), or netCDF with CF names. What is not clear is asked.
        </li>
        <li>
          <b>Depth</b> (m or ft) or <b>sea pressure</b> (dbar), and <b>temperature</b> (°C or °F).
        </li>
        <li>
          <b>Practical salinity</b>, or <b>conductivity</b> or <b>specific conductance</b>. Without any of them the
          water is taken as fresh, or as the basis says.
        </li>
        <li>
          One cast, or many casts told apart by station, cast name, date or time. Latitude, longitude and distance are
          used where they are given, or come from a list of stations dropped beside the casts.
        </li>
      </ul>
      <pre>{EXAMPLE}</pre>
    </section>
  );
}

const EXAMPLE = `station,depth (m),temperature (degC),salinity
Pier,0.5,17.2,4.1
Pier,2.0,16.8,9.7
Pier,4.0,14.1,23.5`;
