//! A rough place from the name of a time zone.

/// Where the principal city of a time zone lies: good enough to say which planets are up, no more.
#[derive(Debug, Clone, PartialEq)]
pub struct RoughPlace {
    /// Geographic latitude, rounded to 0.1 degree, north positive.
    pub latitude_deg: f64,
    /// Geographic longitude, rounded to 0.1 degree, east positive.
    pub longitude_deg: f64,
    /// The city by which the tz database names the zone.
    pub city: String,
}

/// Written by `pkg-config/tables/zones.py`, which describes the layout. Source: the tz database (public domain), whose
/// version stands in `pkg-config/tables/requirements.txt`.
static BYTES: &[u8] = include_bytes!("zones.bin");

/// Looks a zone of the tz database up, by its present name or an old one that browsers still report; the case of the
/// letters does not matter.
///
/// `None` where the name is unknown or stands for no place, as `Etc/UTC` does. The place is that of the zone's principal
/// city and can be more than 1,000 km from the reader.
pub fn rough_place(zone: &str) -> Option<RoughPlace> {
    let table = Table::read(BYTES)?;
    let index = table
        .names()
        .position(|(region, last)| is_spelled(zone, region, last))?;
    let zone_index = match index.checked_sub(table.zone_count) {
        None => index,
        Some(other) => usize::try_from(table.other_zones.value(other)?).ok()?,
    };
    let (_, last) = table.names().nth(zone_index)?;
    Some(RoughPlace {
        latitude_deg: f64::from(table.latitudes_tenth_deg.value(zone_index)?) / 10.0,
        longitude_deg: f64::from(table.longitudes_tenth_deg.value(zone_index)?) / 10.0,
        city: last.replace('_', " "),
    })
}

fn is_spelled(zone: &str, region: &str, last: &str) -> bool {
    match zone.rsplit_once('/') {
        Some((zone_region, zone_last)) => {
            zone_region.eq_ignore_ascii_case(region) && zone_last.eq_ignore_ascii_case(last)
        }
        None => region.is_empty() && zone.eq_ignore_ascii_case(last),
    }
}

/// The packed table, taken apart.
struct Table {
    zone_count: usize,
    latitudes_tenth_deg: Column,
    longitudes_tenth_deg: Column,
    /// For each other name the number of its zone.
    other_zones: Column,
    lines: &'static str,
}

impl Table {
    fn read(bytes: &'static [u8]) -> Option<Self> {
        let (&[zones_low, zones_high, others_low, others_high], rest) =
            bytes.split_first_chunk()?;
        let zone_count = usize::from(u16::from_le_bytes([zones_low, zones_high]));
        let other_count = usize::from(u16::from_le_bytes([others_low, others_high]));
        let (latitudes_tenth_deg, rest) = Column::read(rest, zone_count)?;
        let (longitudes_tenth_deg, rest) = Column::read(rest, zone_count)?;
        let (other_zones, rest) = Column::read(rest, other_count)?;
        let lines = std::str::from_utf8(rest).ok()?;
        Some(Self {
            zone_count,
            latitudes_tenth_deg,
            longitudes_tenth_deg,
            other_zones,
            lines,
        })
    }

    /// Region and last part of every name, zones first.
    fn names(&self) -> impl Iterator<Item = (&'static str, &'static str)> {
        self.lines.lines().scan("", |region, line| {
            let last = match line.rsplit_once('/') {
                Some((new_region, last)) => {
                    *region = new_region;
                    last
                }
                None => line,
            };
            Some((*region, last))
        })
    }
}

/// Whole numbers of 16 bits, all low bytes before all high bytes.
struct Column {
    low: &'static [u8],
    high: &'static [u8],
}

impl Column {
    fn read(bytes: &'static [u8], count: usize) -> Option<(Self, &'static [u8])> {
        let (low, rest) = bytes.split_at_checked(count)?;
        let (high, rest) = rest.split_at_checked(count)?;
        Some((Self { low, high }, rest))
    }

    fn value(&self, index: usize) -> Option<i16> {
        Some(i16::from_le_bytes([
            *self.low.get(index)?,
            *self.high.get(index)?,
        ]))
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[track_caller]
    fn check(zone: &str, latitude_deg: f64, longitude_deg: f64, city: &str) {
        let expected = RoughPlace {
            latitude_deg,
            longitude_deg,
            city: city.to_owned(),
        };
        assert_eq!(rough_place(zone), Some(expected), "{zone}");
    }

    // Degrees and minutes as the tz database prints them, rounded by hand.
    #[test]
    fn zones_have_the_places_of_the_database() {
        check("Europe/Prague", 50.1, 14.4, "Prague");
        check("America/New_York", 40.7, -74.0, "New York");
        check("America/Argentina/Ushuaia", -54.8, -68.3, "Ushuaia");
        check("America/Indiana/Knox", 41.3, -86.6, "Knox");
        check("Asia/Tokyo", 35.7, 139.7, "Tokyo");
        check("Asia/Kathmandu", 27.7, 85.3, "Kathmandu");
        check("Australia/Sydney", -33.9, 151.2, "Sydney");
        check("Africa/Nairobi", -1.3, 36.8, "Nairobi");
        check("Pacific/Auckland", -36.9, 174.8, "Auckland");
        check("Pacific/Kiritimati", 1.9, -157.3, "Kiritimati");
        check("Europe/Oslo", 59.9, 10.8, "Oslo");
        check("Atlantic/Azores", 37.7, -25.7, "Azores");
    }

    #[test]
    fn old_names_lead_to_the_present_zone() {
        for (old, present) in [
            ("Asia/Calcutta", "Asia/Kolkata"),
            ("Europe/Kiev", "Europe/Kyiv"),
            ("Asia/Saigon", "Asia/Ho_Chi_Minh"),
            ("America/Buenos_Aires", "America/Argentina/Buenos_Aires"),
            ("Iceland", "Atlantic/Reykjavik"),
            ("GB", "Europe/London"),
            ("US/Pacific", "America/Los_Angeles"),
            ("america/los_angeles", "America/Los_Angeles"),
        ] {
            assert!(rough_place(present).is_some(), "{present}");
            assert_eq!(rough_place(old), rough_place(present), "{old}");
        }
    }

    #[test]
    fn names_without_a_place_have_none() {
        for zone in [
            "",
            "/",
            "UTC",
            "Etc/UTC",
            "Etc/GMT+5",
            "Prague",
            "Europe/",
            "Europe",
            "Europe/Atlantis",
            "CET",
        ] {
            assert_eq!(rough_place(zone), None, "{zone}");
        }
    }

    #[test]
    fn every_name_leads_to_a_place_on_the_earth() {
        let table = Table::read(BYTES).expect("the table is whole");
        assert!(table.zone_count > 400, "{} zones", table.zone_count);
        assert_eq!(
            table.names().count(),
            table.zone_count + table.other_zones.low.len()
        );
        for (region, last) in table.names() {
            let zone = if region.is_empty() {
                last.to_owned()
            } else {
                format!("{region}/{last}")
            };
            let place = rough_place(&zone).unwrap_or_else(|| panic!("{zone} has no place"));
            assert!(
                place.latitude_deg.abs() <= 90.0 && place.longitude_deg.abs() <= 180.0,
                "{zone}: {place:?}"
            );
            assert!(!place.city.is_empty(), "{zone}");
        }
    }
}
