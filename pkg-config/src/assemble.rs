//! Everything that `cargo widget build` puts into `dist/`.

use crate::bindgen;
use crate::compile::{Compilation, compile};
use crate::inline;
use crate::minify::Minifier;
use crate::optimise::Optimiser;
use crate::pins;
use crate::size;
use crate::workspace::{Workspace, read, read_text, write};
use std::collections::{BTreeMap, BTreeSet};
use std::path::{Path, PathBuf};
use std::time::Instant;

/// Whether what lies in `dist/` went through the optimiser and the minifier.
#[derive(Debug, Clone, PartialEq, Eq)]
pub enum Optimisation {
    Done,
    /// With the sentence that says why not.
    LeftOut(String),
}

/// The page that becomes the one-file page.
const ARTICLE: &str = "article.html";

/// Builds `dist/`; steps whose inputs did not change are not repeated.
pub fn build(workspace: &Workspace) -> Result<Optimisation, String> {
    let start = Instant::now();
    let raw = compile(
        workspace,
        &Compilation {
            target: &workspace.target,
            level: None,
        },
    )?;
    let glued = bindgen::glue(&raw, &workspace.steps().join("glue"))?;
    let (wasm, optimisation) = optimised(workspace, &glued.wasm)?;
    let (scripts, minification) = minified(workspace, &glued.javascript)?;
    let mut dist = Dist::new(workspace.dist());
    dist.put("wanderlight.wasm", &wasm)?;
    dist.put("wanderlight.d.ts", &glued.declarations)?;
    let pages = workspace.root.join("www");
    for path in files_below(&pages)? {
        let name = relative(&pages, &path);
        if !scripts.contains_key(&name) {
            dist.put(&name, &read(&path)?)?;
        }
    }
    for (name, script) in &scripts {
        dist.put(name, script)?;
    }
    for name in ["README.md", "CHANGELOG.md", "LICENSE-MIT", "LICENSE-APACHE"] {
        let path = workspace.root.join(name);
        if path.is_file() {
            dist.put(name, &read(&path)?)?;
        }
    }
    let manifest = read_text(&workspace.settings().join("npm-manifest.json"))?;
    dist.put(
        "package.json",
        npm_manifest(&manifest, &workspace.version)?.as_bytes(),
    )?;
    let article = read_text(&dist.folder.join(ARTICLE))?;
    let single = inline::single_page(&article, "wanderlight.wasm", &|name| {
        read(&dist.folder.join(name))
    })?;
    dist.put("wanderlight-single.html", single.as_bytes())?;
    dist.remove_others()?;
    println!(
        "Built {} in {:.1} s: module {} bytes, one-file page {} bytes.",
        dist.folder.display(),
        start.elapsed().as_secs_f64(),
        wasm.len(),
        single.len()
    );
    Ok(match optimisation {
        Optimisation::Done => minification,
        left_out => left_out,
    })
}

/// The glue and the scripts of the pages by name, minified; without a minifier as they are, after saying so.
fn minified(
    workspace: &Workspace,
    glue: &[u8],
) -> Result<(BTreeMap<String, Vec<u8>>, Optimisation), String> {
    let pages = workspace.root.join("www");
    let mut scripts = BTreeMap::from([("wanderlight.js".to_string(), glue.to_vec())]);
    for path in files_below(&pages)? {
        if path.extension().is_some_and(|ending| ending == "js") {
            let name = relative(&pages, &path);
            if scripts.insert(name.clone(), read(&path)?).is_some() {
                return Err(format!("Two sources want to be dist/{name}."));
            }
        }
    }
    let attempt = Minifier::find(workspace).and_then(|minifier| {
        let smaller = scripts.iter().map(|(name, source)| {
            let folder = workspace.steps().join("minified").join(name);
            Ok((name.clone(), minifier.minify(source, &folder)?))
        });
        smaller.collect()
    });
    match attempt {
        Ok(smaller) => Ok((smaller, Optimisation::Done)),
        Err(sentence) => {
            println!("{sentence} The build goes on without: the scripts are not minified.");
            Ok((scripts, Optimisation::LeftOut(sentence)))
        }
    }
}

/// The optimised module; without an optimiser the given one, after saying how much larger that is.
fn optimised(workspace: &Workspace, wasm: &[u8]) -> Result<(Vec<u8>, Optimisation), String> {
    let attempt = Optimiser::find(workspace)
        .and_then(|optimiser| optimiser.optimise(wasm, &workspace.steps().join("optimised")));
    match attempt {
        Ok(smaller) => Ok((smaller, Optimisation::Done)),
        Err(sentence) => {
            let pinned = pins::Pins::read(workspace)?.pinned("wasm");
            println!(
                "{sentence} {}",
                how_much_larger(size::brotli_bytes(wasm)?, pinned)
            );
            Ok((wasm.to_vec(), Optimisation::LeftOut(sentence)))
        }
    }
}

fn how_much_larger(brotli_bytes: u64, pinned_brotli_bytes: Option<u64>) -> String {
    match pinned_brotli_bytes {
        Some(pinned) if pinned > 0 => format!(
            "The build goes on without: the module is {:.0} % larger than the optimised one ({brotli_bytes} bytes compressed against {pinned}).",
            (brotli_bytes as f64 / pinned as f64 - 1.0) * 100.0
        ),
        _ => format!("The build goes on without: the module has {brotli_bytes} bytes compressed."),
    }
}

/// The npm manifest: the template with the library's version.
fn npm_manifest(template: &str, version: &str) -> Result<String, String> {
    let mut manifest: serde_json::Value = serde_json::from_str(template)
        .map_err(|cause| format!("pkg-config/npm-manifest.json: {cause}."))?;
    manifest["version"] = version.into();
    Ok(format!("{manifest:#}\n"))
}

/// The folder that is built, with the names put there so far.
struct Dist {
    folder: PathBuf,
    names: BTreeSet<String>,
}

impl Dist {
    fn new(folder: PathBuf) -> Self {
        Self {
            folder,
            names: BTreeSet::new(),
        }
    }

    fn put(&mut self, name: &str, bytes: &[u8]) -> Result<(), String> {
        if !self.names.insert(name.to_string()) {
            return Err(format!("Two sources want to be dist/{name}."));
        }
        write(&self.folder.join(name), bytes)
    }

    /// Files of an earlier build must not look like part of this one.
    fn remove_others(&self) -> Result<(), String> {
        for path in files_below(&self.folder)? {
            if !self.names.contains(&relative(&self.folder, &path)) {
                std::fs::remove_file(&path)
                    .map_err(|cause| format!("{} cannot be removed: {cause}.", path.display()))?;
            }
        }
        Ok(())
    }
}

/// All files below a folder in the order of their names.
pub fn files_below(folder: &Path) -> Result<Vec<PathBuf>, String> {
    let complain = |cause: std::io::Error| format!("{} cannot be read: {cause}.", folder.display());
    let mut paths = std::fs::read_dir(folder)
        .and_then(|entries| {
            entries
                .map(|entry| entry.map(|entry| entry.path()))
                .collect::<Result<Vec<_>, _>>()
        })
        .map_err(complain)?;
    paths.sort();
    let mut files = Vec::new();
    for path in paths {
        if path.is_dir() {
            files.extend(files_below(&path)?);
        } else {
            files.push(path);
        }
    }
    Ok(files)
}

/// A path below a folder, written with `/`.
fn relative(folder: &Path, path: &Path) -> String {
    let parts = path.strip_prefix(folder).unwrap_or(path).components();
    parts
        .map(|part| part.as_os_str().to_string_lossy())
        .collect::<Vec<_>>()
        .join("/")
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn the_manifest_takes_the_version_of_the_library() {
        let text = npm_manifest(include_str!("../npm-manifest.json"), "1.2.3").unwrap();
        let manifest: serde_json::Value = serde_json::from_str(&text).unwrap();
        assert_eq!(
            (&manifest["name"], &manifest["version"]),
            (&"wanderlight".into(), &"1.2.3".into())
        );
        assert!(manifest["types"].as_str().unwrap().ends_with(".d.ts"));
    }

    #[test]
    fn a_build_without_optimiser_says_what_it_costs() {
        assert!(how_much_larger(110, Some(100)).contains("10 % larger"));
        assert!(how_much_larger(110, None).contains("110 bytes"));
    }

    #[test]
    fn files_of_an_earlier_build_are_removed() {
        let folder = std::env::temp_dir().join(format!("wanderlight-dist-{}", std::process::id()));
        write(&folder.join("old/left.js"), b"old").unwrap();
        let mut dist = Dist::new(folder.clone());
        dist.put("new/page.html", b"new").unwrap();
        assert!(dist.put("new/page.html", b"again").is_err());
        dist.remove_others().unwrap();
        let names: Vec<_> = files_below(&folder)
            .unwrap()
            .iter()
            .map(|path| relative(&folder, path))
            .collect();
        assert_eq!(names, ["new/page.html"]);
        std::fs::remove_dir_all(&folder).unwrap();
    }
}
