//! How many bytes a page loads, as they are and as a server sends them.

use crate::arguments::SizeMode;
use crate::assemble::{self, Optimisation, files_below};
use crate::bindgen;
use crate::compile::{Compilation, compile};
use crate::modules::reachable;
use crate::optimise::Optimiser;
use crate::pins::Pins;
use crate::workspace::{Workspace, read, read_text};
use flate2::Compression;
use flate2::write::GzEncoder;
use std::io::Write;

/// The sizes of one thing in bytes.
#[derive(Debug, Clone, Copy, Default)]
pub struct Sizes {
    pub raw: u64,
    pub gzip: u64,
    pub brotli: u64,
}

impl std::ops::Add for Sizes {
    type Output = Self;
    fn add(self, other: Self) -> Self {
        Self {
            raw: self.raw + other.raw,
            gzip: self.gzip + other.gzip,
            brotli: self.brotli + other.brotli,
        }
    }
}

/// A thing whose size is of interest; pinned ones are judged by the tests.
pub struct Item {
    pub name: String,
    pub sizes: Sizes,
    pub is_pinned: bool,
}

/// The size after the strongest brotli compression.
pub fn brotli_bytes(bytes: &[u8]) -> Result<u64, String> {
    let parameters = brotli::enc::BrotliEncoderParams {
        quality: 11,
        lgwin: 22,
        size_hint: bytes.len(),
        ..Default::default()
    };
    let mut compressed = Vec::new();
    brotli::BrotliCompress(&mut &bytes[..], &mut compressed, &parameters)
        .map_err(|cause| format!("Brotli failed: {cause}."))?;
    Ok(compressed.len() as u64)
}

fn sizes(bytes: &[u8]) -> Result<Sizes, String> {
    let mut gzip = GzEncoder::new(Vec::new(), Compression::best());
    let gzip = gzip
        .write_all(bytes)
        .and_then(|()| gzip.finish())
        .map_err(|cause| format!("Gzip failed: {cause}."))?;
    Ok(Sizes {
        raw: bytes.len() as u64,
        gzip: gzip.len() as u64,
        brotli: brotli_bytes(bytes)?,
    })
}

/// Measures what `dist/` and the packed tables hold.
pub fn measure(workspace: &Workspace) -> Result<Vec<Item>, String> {
    let dist = workspace.dist();
    let mut items = Vec::new();
    let mut add = |name: &str, sizes, is_pinned| {
        items.push(Item {
            name: name.to_string(),
            sizes,
            is_pinned,
        })
    };
    let wasm = sizes(&read(&dist.join("wanderlight.wasm"))?)?;
    let glue = sizes(&read(&dist.join("wanderlight.js"))?)?;
    // The element is several files that a server compresses one by one.
    let mut element = Sizes::default();
    for (path, source) in reachable("wander-light.js", &|path| read_text(&dist.join(path)))? {
        if path != "wanderlight.js" {
            element = element + sizes(source.as_bytes())?;
        }
    }
    add("wasm", wasm, true);
    add("glue", glue, true);
    add("element", element, true);
    add("wire", wasm + glue + element, true);
    add(
        "single",
        sizes(&read(&dist.join("wanderlight-single.html"))?)?,
        true,
    );
    let mut together = Vec::new();
    for path in files_below(&workspace.root.join("src"))? {
        if path.extension().is_some_and(|ending| ending == "bin") {
            let bytes = read(&path)?;
            let name = path
                .strip_prefix(&workspace.root)
                .unwrap_or(&path)
                .display()
                .to_string();
            add(&name, sizes(&bytes)?, false);
            together.extend(bytes);
        }
    }
    add("tables", sizes(&together)?, true);
    Ok(items)
}

/// `cargo widget size`.
pub fn print(workspace: &Workspace, mode: SizeMode) -> Result<(), String> {
    if mode == SizeMode::Levels {
        return print_levels(workspace);
    }
    let optimisation = assemble::build(workspace)?;
    let items = measure(workspace)?;
    let mut pins = Pins::read(workspace)?;
    println!(
        "\n{:<28} {:>9} {:>9} {:>9} {:>9} {:>9}",
        "bytes", "raw", "gzip", "brotli", "pinned", "budget"
    );
    for Item { name, sizes, .. } in &items {
        let known =
            |number: Option<u64>| number.map_or("-".to_string(), |number| number.to_string());
        let (pinned, budget) = (known(pins.pinned(name)), known(pins.budget(name)));
        println!(
            "{name:<28} {:>9} {:>9} {:>9} {pinned:>9} {budget:>9}",
            sizes.raw, sizes.gzip, sizes.brotli
        );
    }
    println!(
        "\nwire: wasm, glue and element, what a page loads; tables: the packed tables inside the wasm."
    );
    if mode == SizeMode::Pin {
        if let Optimisation::LeftOut(sentence) = optimisation {
            return Err(format!(
                "Nothing was pinned, because the module is not optimised. {sentence}"
            ));
        }
        let measured: Vec<_> = items
            .iter()
            .filter(|item| item.is_pinned)
            .map(|item| (item.name.as_str(), item.sizes.brotli))
            .collect();
        pins.pin(&measured)?;
        println!("Pinned in pkg-config/pins.json.");
    }
    Ok(())
}

/// Builds at each level that may be the smallest or the fastest; which one is, changes with the code.
fn print_levels(workspace: &Workspace) -> Result<(), String> {
    let optimiser = Optimiser::find(workspace)?;
    let folder = workspace.target.join("levels");
    let mut lines = Vec::new();
    for level in ["s", "z", "3"] {
        let raw = compile(
            workspace,
            &Compilation {
                target: &folder,
                level: Some(level),
            },
        )?;
        let glued = bindgen::glue(&raw, &folder.join("glue"))?;
        let wasm = optimiser.optimise(&glued.wasm, &folder.join("optimised"))?;
        let sizes = sizes(&wasm)?;
        lines.push(format!(
            "{level:<9} {:>11} {:>9} {:>9} {:>9}",
            glued.wasm.len(),
            sizes.raw,
            sizes.gzip,
            sizes.brotli
        ));
    }
    println!(
        "\n{:<9} {:>11} {:>9} {:>9} {:>9}",
        "opt-level", "unoptimised", "raw", "gzip", "brotli"
    );
    println!("{}", lines.join("\n"));
    Ok(())
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn repetition_compresses() {
        let text = "phase angle and lit fraction ".repeat(100);
        let found = sizes(text.as_bytes()).unwrap();
        assert_eq!(found.raw, 2900);
        assert!(found.brotli < found.gzip && found.gzip < 100, "{found:?}");
        assert!(found.brotli > 20, "{found:?}");
    }
}
