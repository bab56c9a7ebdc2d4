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

/** A kind of event by its name; `eventKinds()` gives the definitions. */
export type EventKind =
  | "inferior-conjunction" | "superior-conjunction" | "conjunction" | "opposition"
  | "quadrature-east" | "quadrature-west" | "greatest-elongation-east" | "greatest-elongation-west"
  | "greatest-illuminated-extent" | "greatest-brightness" | "half-phase"
  | "station-retrograde" | "station-direct" | "closest-approach" | "perihelion" | "aphelion"
  | "new-moon" | "first-quarter" | "full-moon" | "last-quarter" | "moon-perigee" | "moon-apogee"
  | "moon-conjunction" | "moon-closest" | "occultation" | "same-phase"
  | "planet-conjunction" | "planet-closest" | "transit" | "transit-near-miss";

export interface EventsQuery {
  /** Start; an event at this instant belongs to the span. As `utc` of `CircumstancesQuery`. */
  fromUtc: string;
  /** End; an event at this instant does not belong to the span, so that spans that follow each other share none. */
  toUtc: string;
  /** Events in which at least one of these takes part; all when absent. */
  bodies?: BodyName[];
  /** All kinds when absent. */
  kinds?: EventKind[];
  /** With a longitude: transits and occultations tell what is seen there. */
  latitudeDeg?: number;
  longitudeDeg?: number;
  heightM?: number;
}

/** Figures of an event, geocentric and of `body`; a key is absent where it has no meaning. */
export interface EventValues {
  distanceAu?: number;
  /** Perihelion and aphelion: geometric distance from the Sun. */
  sunDistanceAu?: number;
  elongationDeg?: number;
  /** Angle between the two bodies; of a transit between the planet and the Sun's centre. */
  separationDeg?: number;
  /** Of Mars averaged over its rotation. */
  magnitude?: number;
  illuminatedFraction?: number;
  litAreaArcsec2?: number;
  angularDiameterArcsec?: number;
  otherIlluminatedFraction?: number;
  /** Transits: least angle between the centres in semidiameters of the Sun (959.63 arcsec at 1 au). */
  separationSunRadii?: number;
  sunSemidiameterArcsec?: number;
  /** Transits: position angle of the planet at the Sun's centre, from celestial north through east. */
  positionAngleDeg?: number;
  /** Transits: from the first to the last contact. */
  durationMinutes?: number;
  /** A lesser peak beside a greater one. */
  secondary?: true;
  /** Transits: the whole planet is never inside the Sun's disc. */
  grazing?: true;
  waxing?: boolean;
  otherWaxing?: boolean;
}

/** An instant within an event. */
export interface Contact {
  name: "first-contact" | "second-contact" | "third-contact" | "fourth-contact" | "disappearance" | "reappearance";
  utc: string;
  /** Direction of the planet at the Sun's or the Moon's centre, from celestial north through east. */
  positionAngleDeg: number;
  /** Seen from a place: altitudes without refraction. */
  altitudeDeg?: number;
  sunAltitudeDeg?: number;
}

export interface SkyEvent {
  kind: EventKind;
  body: BodyName;
  other?: BodyName;
  utc: string;
  /** Of a hundred events about one is farther off. */
  timeUncertaintySeconds: number;
  values: EventValues;
  /** Transits: contacts seen from the Earth's centre. */
  contacts?: Contact[];
  /** Transits and occultations with a place: how they are seen there; no contacts when they are not. */
  local?: { aboveHorizon: boolean; contacts: Contact[] };
}

export interface ApparitionsQuery {
  body: BodyName;
  fromUtc: string;
  toUtc: string;
  /** Also compare each with those of 1900 to 2100, which takes up to a second. */
  rank?: boolean;
}

export interface Apparition {
  /** Evening and morning of Mercury and Venus; an outer planet is up by night. */
  side: "evening" | "morning" | "night";
  /** The conjunctions with the Sun before and after it. */
  fromUtc: string;
  toUtc: string;
  turningPoints: SkyEvent[];
  /** Smallest magnitude while the planet stands at least 10 degrees from the Sun. */
  peakMagnitude: number;
  peakUtc: string;
  largestElongationDeg: number;
  largestLitAreaArcsec2: number;
  /** By peak magnitude among the apparitions of the same side from 1900 to 2100. */
  rank?: { position: number; of: number; brighterBeforeUtc: string | null; brighterAfterUtc: string | null };
}

export interface Apparitions {
  apparitions: Apparition[];
  rhythm: {
    meanSynodicPeriodDays: number;
    /** Shortest and longest of those that end in the span; null when none does. */
    shortestSynodicPeriodDays: number | null;
    longestSynodicPeriodDays: number | null;
    orbitsPerSynodicPeriod: number;
    orbitalSpeedKmS: number;
    orbitalSpeedMiS: number;
    earthOrbitalSpeedKmS: number;
    earthOrbitalSpeedMiS: number;
    /** Venus: days by which the fifth inferior conjunction on misses the same date after eight years. */
    eightYearDriftDays: number | null;
  };
}
