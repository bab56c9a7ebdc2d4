//! Facts told in words and as a table; it formats and never computes.
//!
//! Numbers and dates are written by a [`Formats`], sentences by a [`Words`], so another language is one more file
//! beside `english.rs` and the page's own locale can supply the rest. Rounding is decided once, in [`Figures`].

mod english;
mod english_page;
mod english_plan;
mod english_sentences;
mod figures;
mod formats;
mod page;
mod plan;
mod reading;
mod sentence;
mod table;
mod words;

pub use english::English;
pub use figures::{AreaScale, Figures};
pub use formats::{DateForm, EnglishFormats, Formats};
pub use page::{DistanceTold, Label, NightEdge, Outlook, PageWords, SpotName, Units};
pub(crate) use plan::elongation;
pub use plan::{PlanLabels, PlanStory, sentence_plan};
pub use reading::{GreatestExtent, Highlights, Peak, Reading};
pub(crate) use sentence::{MOON_WIDTH_ARCSEC, moon_divisor};
pub use sentence::{announce, sentence_disc, sentence_tradeoff};
pub use table::{Table, reading_table};
pub use words::{Column, DiscStory, Orientation, Story, Told, Words};
