/** A body by its name in the module. */
export type BodyName =
  | "sun" | "moon" | "mercury" | "venus" | "mars" | "jupiter" | "saturn" | "uranus" | "neptune";

/** What every function throws: `message` is a sentence that says what is allowed, `code` never changes. */
export interface WanderlightError extends Error {
  code:
    | "unknown-body" | "bad-instant" | "out-of-span" | "bad-place" | "bad-step" | "bad-option" | "drawing";
}

/** A remark that limits how far an answer may be trusted. */
export interface Warning {
  /** Stable, kebab case. */
  code: string;
  /** One sentence for people. */
  message: string;
}

export interface CircumstancesQuery {
  body: BodyName;
  /** RFC 3339 with any offset, or a plain date (0h UTC); years 1600 to 2300, checked 1700 to 2200. */
  utc: string;
  /** Geodetic latitude, degrees, -90 to 90, north positive. Give it together with the longitude. */
  latitudeDeg?: number;
  /** Longitude, degrees, -360 to 360, east positive. */
  longitudeDeg?: number;
  /** Height above the ellipsoid, metres, -500 to 9000; 0 when absent. */
  heightM?: number;
}

/** What the sky shows of one body at one instant. Magnitudes are V; angles are degrees unless the key says otherwise. */
export interface Circumstances {
  body: BodyName;
  /** The instant, RFC 3339, UTC, to the second. */
  utc: string;
  /** TT - UT1 used for this instant, seconds. */
  deltaTSeconds: number;
  /** Geocentric apparent right ascension, true equator and equinox of date, degrees. */
  rightAscensionDeg: number;
  /** Geocentric apparent declination, true equator and equinox of date, degrees. */
  declinationDeg: number;
  /** Geocentric apparent ecliptic longitude of date, degrees. */
  eclipticLongitudeDeg: number;
  /** Geocentric apparent ecliptic latitude of date, degrees. */
  eclipticLatitudeDeg: number;
  /** Distance from the Earth's centre that the arriving light has travelled, au. */
  distanceAu: number;
  /** Distance from the Sun when the light left, au; 0 for the Sun. */
  sunDistanceAu: number;
  /** Travel time of the light, seconds. */
  lightTimeSeconds: number;
  /** Travel time of the light, minutes. */
  distanceLightMinutes: number;
  /** Angle Sun-body-Earth, degrees, 0 to 180; null for the Sun. */
  phaseAngleDeg: number | null;
  /** Lit share of the disc, 0 to 1; null for the Sun. */
  illuminatedFraction: number | null;
  /** Whether the lit share is growing; null for the Sun. */
  waxing: boolean | null;
  /** Angle between the body and the Sun in the sky, degrees, 0 to 180; null for the Sun. */
  elongationDeg: number | null;
  /** "east": follows the Sun, an evening body; "west": precedes it, a morning body; null for the Sun. */
  elongationSide: "east" | "west" | null;
  /** Equatorial diameter of the disc, arcseconds. */
  angularDiameterArcsec: number;
  /** Lit area of the disc in the sky, square arcseconds (Saturn: without the rings; the Sun: its whole disc). */
  litAreaArcsec2: number;
  /** Speed around the Sun, the Moon's around the Earth, km/s; null for the Sun. */
  orbitalSpeedKmS: number | null;
  /** Visual magnitude outside the air; null where the published law has no value. */
  magnitude: number | null;
  /** Mean surface brightness of the lit area, magnitudes per square arcsecond; null without a magnitude. */
  surfaceBrightnessMagArcsec2: number | null;
  /** Direction of the middle of the lit limb, degrees from celestial north through east; null for the Sun. */
  brightLimbAngleDeg: number | null;
  /** Saturn only: direction of the northern pole of the rings, degrees from celestial north through east. */
  axisAngleDeg?: number;
  /** Saturn only: latitude of the Earth above the plane of the rings, degrees, north positive. */
  ringOpeningDeg?: number;
  /** With a place: altitude of the centre without refraction, degrees. */
  altitudeDeg?: number;
  /** With a place: altitude lifted by standard refraction, degrees. */
  apparentAltitudeDeg?: number;
  /** With a place: azimuth from north through east, degrees. */
  azimuthDeg?: number;
  /** With a place: direction of the zenith, degrees from celestial north through east. */
  parallacticAngleDeg?: number;
  /** With a place: magnitude dimmed by the air at that altitude; null below the horizon or without a magnitude. */
  apparentMagnitude?: number | null;
  warnings: Warning[];
}

export interface SeriesQuery {
  body: BodyName;
  /** First instant, as `utc` of `CircumstancesQuery`. */
  fromUtc: string;
  /** Last instant; the last sample lies at it or less than a step before it. */
  toUtc: string;
  /** Days between samples, more than 0; at most 100,000 samples. */
  stepDays: number;
}

/** One column per quantity, all of the same length; NaN where a value does not exist. Units as in `Circumstances`. */
export interface Series {
  /** Instants, RFC 3339, UTC. */
  utc: string[];
  /** 0 to 1. */
  illuminatedFraction: Float64Array;
  /** Arcseconds. */
  angularDiameterArcsec: Float64Array;
  /** V magnitudes. */
  magnitude: Float64Array;
  /** Square arcseconds. */
  litAreaArcsec2: Float64Array;
  /** Degrees, 0 to 180. */
  elongationDeg: Float64Array;
  /** Astronomical units. */
  distanceAu: Float64Array;
}
