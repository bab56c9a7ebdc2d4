//! From the raw module to a module with JavaScript glue and TypeScript declarations.

use crate::freshness;
use crate::workspace::{read, write};
use std::path::Path;
use wasm_bindgen_cli_support::Bindgen;

/// The name of all three files.
const NAME: &str = "wanderlight";

/// The version of the glue generator; it is part of a result's fingerprint.
const VERSION: &str = "0.2.130";

/// What bindgen makes of a raw module.
pub struct Glued {
    pub javascript: Vec<u8>,
    pub declarations: Vec<u8>,
    pub wasm: Vec<u8>,
}

/// Runs bindgen on a raw module, or takes its last result out of `folder` when the module is the same.
pub fn glue(raw: &Path, folder: &Path) -> Result<Glued, String> {
    let bytes = read(raw)?;
    let [javascript, declarations, wasm] =
        ["js", "d.ts", "wasm"].map(|ending| folder.join(format!("{NAME}.{ending}")));
    let stamp = folder.join("fingerprint");
    let fingerprint = freshness::fingerprint(&[VERSION.as_bytes(), &bytes]);
    if !freshness::is_fresh(&stamp, &fingerprint, &[&javascript, &declarations, &wasm]) {
        let glued = generate(bytes)?;
        write(&javascript, &glued.javascript)?;
        write(&declarations, &glued.declarations)?;
        write(&wasm, &glued.wasm)?;
        freshness::note(&stamp, &fingerprint)?;
    }
    Ok(Glued {
        javascript: read(&javascript)?,
        declarations: read(&declarations)?,
        wasm: read(&wasm)?,
    })
}

fn generate(raw: Vec<u8>) -> Result<Glued, String> {
    let complain = |cause: &dyn std::fmt::Display| {
        format!("The JavaScript glue could not be generated: {cause}.")
    };
    let mut bindgen = Bindgen::new();
    bindgen.web(true).map_err(|cause| complain(&cause))?;
    let mut output = bindgen
        .input_bytes(NAME, raw)
        .omit_default_module_path(false)
        .typescript(true)
        .remove_name_section(true)
        .remove_producers_section(true)
        .generate_output()
        .map_err(|cause| complain(&format!("{cause:#}")))?;
    if output.snippets().values().any(|list| !list.is_empty()) || !output.local_modules().is_empty()
    {
        return Err(complain(
            &"the library brings JavaScript snippets of its own, which the one-file page cannot carry",
        ));
    }
    let declarations = output
        .ts()
        .ok_or_else(|| complain(&"there are no declarations"))?
        .to_string();
    let mut javascript = name_module(output.js())?;
    let module = output.wasm_mut();
    for (count, import) in module.imports.iter_mut().enumerate() {
        if let Some(renamed) = with_short_import(&javascript, &import.name, count) {
            javascript = renamed;
            import.name = short_import(count);
        }
    }
    Ok(Glued {
        javascript: javascript.into_bytes(),
        declarations: declarations.into_bytes(),
        wasm: module.emit_wasm(),
    })
}

/// Bindgen ends the name of an import with a hash, random digits that both files carry and no compression shortens.
fn with_short_import(javascript: &str, name: &str, count: usize) -> Option<String> {
    let key = format!("{name}: ");
    (javascript.matches(&key).count() == 1)
        .then(|| javascript.replace(&key, &format!("{}: ", short_import(count))))
}

fn short_import(count: usize) -> String {
    format!("i{count}")
}

/// Bindgen expects its module under a name with `_bg`; pages are easier to read with one plain name.
fn name_module(javascript: &str) -> Result<String, String> {
    let usual = format!("{NAME}_bg.wasm");
    if !javascript.contains(&usual) {
        return Err(format!(
            "The JavaScript glue does not mention {usual}, so it cannot be renamed."
        ));
    }
    Ok(javascript.replace(&usual, &format!("{NAME}.wasm")))
}

#[cfg(test)]
mod tests {
    use super::*;

    /// The version in a line such as `wasm-bindgen = "=0.2.130"`.
    fn locked<'a>(manifest: &'a str, package: &str) -> Option<&'a str> {
        let line = manifest
            .lines()
            .find(|line| line.split('=').next().map(str::trim) == Some(package))?;
        line.split_once("\"=")?.1.split('"').next()
    }

    #[test]
    fn the_generator_has_the_version_of_the_library() {
        let library = include_str!("../../Cargo.toml");
        let tool = include_str!("../Cargo.toml");
        assert_eq!(locked(library, "wasm-bindgen"), Some(VERSION));
        assert_eq!(locked(tool, "wasm-bindgen-cli-support"), Some(VERSION));
    }

    #[test]
    fn only_an_import_found_once_is_renamed() {
        let glue = "__wbg_fill_0a1b: function() {},\n__wbg_fill_0a1b2: function() {}";
        let renamed = with_short_import(glue, "__wbg_fill_0a1b", 7).unwrap();
        assert_eq!(
            renamed,
            "i7: function() {},\n__wbg_fill_0a1b2: function() {}"
        );
        assert_eq!(with_short_import(glue, "__wbg_stroke_3c4d", 8), None);
    }

    #[test]
    fn the_module_loses_its_suffix() {
        let renamed = name_module("new URL('wanderlight_bg.wasm', import.meta.url)").unwrap();
        assert_eq!(renamed, "new URL('wanderlight.wasm', import.meta.url)");
        assert!(
            name_module("nothing")
                .unwrap_err()
                .contains("wanderlight_bg.wasm")
        );
    }
}
