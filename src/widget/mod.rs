//! The page's side, compiled for WebAssembly only: exported functions, the element's state, its canvas.
//!
//! This is the only place that knows wasm-bindgen, web-sys and js-sys, and the only one that reads a clock,
//! a zone or a language.

mod attributes;
mod canvas;
pub mod exhibit;
mod host;
pub mod module;
mod motion;
mod plain;
mod plan;
pub mod queries;
mod scene;
mod settings;
mod words;

/// A small allocator: the module allocates little and briefly, so a few kilobytes less to load count for more.
#[global_allocator]
static ALLOCATOR: rlsf::SmallGlobalTlsf = rlsf::SmallGlobalTlsf::new();
