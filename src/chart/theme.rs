//! Colours of the pictures.
//!
//! Every text colour has a contrast of at least 4.5 to 1 on its background and every line that carries meaning at
//! least 3 to 1 (WCAG 2.2, success criteria 1.4.3 and 1.4.11); a test computes them.

/// A colour in sRGB, eight bits a channel.
#[derive(Debug, Clone, Copy, PartialEq, Eq)]
pub struct Colour(pub u8, pub u8, pub u8);

/// The colours of one appearance.
#[derive(Debug, Clone, PartialEq, Eq)]
pub struct Theme {
    /// Behind everything.
    pub background: Colour,
    /// Behind one strip or one lane.
    pub panel: Colour,
    /// Grid and quiet outlines; carries no meaning alone.
    pub grid: Colour,
    /// Readings and names.
    pub ink: Colour,
    /// Axis labels and remarks.
    pub muted: Colour,
    /// Lines that stand for light: the curve of the lit share, the bar of a flat peak.
    pub light: Colour,
    /// The part of a disc that the Sun reaches.
    pub sunlit: Colour,
    /// Area under the curve of the lit share and of the lit area.
    pub light_tint: Colour,
    /// Size: the outline of the disc and its diameter.
    pub size: Colour,
    /// Area under the curve of the diameter.
    pub size_tint: Colour,
    /// The part of the disc that the Sun does not reach.
    pub night_side: Colour,
    /// Outline of a disc.
    pub limb: Colour,
    /// The halo around the point of light.
    pub glow: Colour,
    /// The chosen date.
    pub chosen: Colour,
    /// Text on the handle of the chosen date.
    pub on_chosen: Colour,
    /// The edge of the Moon, drawn for scale.
    pub moon: Colour,
}

impl Theme {
    /// Dark ink on white, fit for print.
    pub const fn light() -> Theme {
        Theme {
            background: Colour(255, 255, 255),
            panel: Colour(246, 247, 249),
            grid: Colour(221, 225, 231),
            ink: Colour(27, 33, 46),
            muted: Colour(87, 96, 112),
            light: Colour(166, 101, 10),
            sunlit: Colour(240, 171, 43),
            light_tint: Colour(248, 229, 190),
            size: Colour(35, 98, 166),
            size_tint: Colour(214, 228, 244),
            night_side: Colour(207, 212, 221),
            limb: Colour(87, 96, 112),
            glow: Colour(246, 205, 116),
            chosen: Colour(163, 44, 84),
            on_chosen: Colour(255, 255, 255),
            moon: Colour(231, 234, 239),
        }
    }

    /// Light ink on a night sky.
    pub const fn dark() -> Theme {
        Theme {
            background: Colour(15, 19, 28),
            panel: Colour(22, 28, 40),
            grid: Colour(46, 55, 72),
            ink: Colour(234, 237, 243),
            muted: Colour(160, 170, 187),
            light: Colour(243, 186, 86),
            sunlit: Colour(250, 205, 118),
            light_tint: Colour(72, 59, 38),
            size: Colour(126, 178, 240),
            size_tint: Colour(32, 51, 78),
            night_side: Colour(45, 53, 70),
            limb: Colour(128, 139, 158),
            glow: Colour(128, 101, 52),
            chosen: Colour(240, 139, 172),
            on_chosen: Colour(15, 19, 28),
            moon: Colour(38, 46, 61),
        }
    }

    /// Dim red on black, for eyes that are used to the dark.
    pub const fn night() -> Theme {
        Theme {
            background: Colour(0, 0, 0),
            panel: Colour(16, 2, 1),
            grid: Colour(56, 11, 7),
            ink: Colour(246, 74, 56),
            muted: Colour(234, 56, 40),
            light: Colour(250, 84, 62),
            sunlit: Colour(250, 84, 62),
            light_tint: Colour(58, 12, 8),
            size: Colour(214, 52, 38),
            size_tint: Colour(38, 8, 5),
            night_side: Colour(40, 9, 6),
            limb: Colour(176, 42, 30),
            glow: Colour(112, 26, 18),
            chosen: Colour(255, 96, 72),
            on_chosen: Colour(0, 0, 0),
            moon: Colour(30, 6, 4),
        }
    }
}
