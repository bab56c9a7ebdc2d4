// A small consumer of the declarations, checked by `tsc --strict`; it is never run.
import init, {
  circumstances,
  initSync,
  series,
  type BodyName,
  type Circumstances,
  type CircumstancesQuery,
  type Series,
  type WanderlightError,
} from "wanderlight";

export async function crescentReport(body: BodyName): Promise<string> {
  await init();
  const query: CircumstancesQuery = { body, utc: "2026-11-25T06:00:00Z", latitudeDeg: 54.5, longitudeDeg: -3.1 };
  const answer: Circumstances = circumstances(query);
  const lit: number | null = answer.illuminatedFraction;
  const altitude: number | undefined = answer.altitudeDeg;
  const span: Series = series({ body, fromUtc: "2026-11-01", toUtc: "2026-12-01", stepDays: 1 });
  const brightest: number = span.magnitude.reduce((least, value) => Math.min(least, value), Infinity);
  return `${lit ?? "none"} ${altitude?.toFixed(0)} ${brightest} ${answer.warnings.map((warning) => warning.code).join()}`;
}

export function codeOf(error: unknown): WanderlightError["code"] | undefined {
  return error instanceof Error ? (error as WanderlightError).code : undefined;
}

export function fromBytes(bytes: Uint8Array): void {
  initSync({ module: bytes });
}

// @ts-expect-error a planet that the module does not know
circumstances({ body: "vulcan", utc: "2026-01-01" });
// @ts-expect-error the step is missing
series({ body: "venus", fromUtc: "2026-01-01", toUtc: "2026-02-01" });
// @ts-expect-error magnitude may be null
const magnitude: number = circumstances({ body: "moon", utc: "2026-01-01" }).magnitude;
