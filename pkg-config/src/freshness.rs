//! Whether a step's result on disk still belongs to its inputs.

use crate::workspace::write;
use sha2::{Digest, Sha256};
use std::path::Path;

/// A fingerprint of several inputs; their lengths are part of it, so that shifting bytes between inputs changes it.
pub fn fingerprint(inputs: &[&[u8]]) -> String {
    let mut hash = Sha256::new();
    for input in inputs {
        hash.update((input.len() as u64).to_le_bytes());
        hash.update(input);
    }
    hash.finalize()
        .iter()
        .map(|byte| format!("{byte:02x}"))
        .collect()
}

/// Whether every result is there and was made from inputs of this fingerprint.
pub fn is_fresh(stamp: &Path, fingerprint: &str, results: &[&Path]) -> bool {
    std::fs::read_to_string(stamp).is_ok_and(|found| found == fingerprint)
        && results.iter().all(|path| path.exists())
}

/// Notes the fingerprint of the inputs that the results now on disk were made from.
pub fn note(stamp: &Path, fingerprint: &str) -> Result<(), String> {
    write(stamp, fingerprint.as_bytes())
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn every_input_and_boundary_counts() {
        let base = fingerprint(&[b"ab", b"c"]);
        assert_eq!(base, fingerprint(&[b"ab", b"c"]));
        assert_ne!(base, fingerprint(&[b"a", b"bc"]));
        assert_ne!(base, fingerprint(&[b"ab", b"d"]));
        assert_eq!(base.len(), 64);
    }

    #[test]
    fn a_missing_result_or_another_fingerprint_is_stale() {
        let folder =
            std::env::temp_dir().join(format!("wanderlight-freshness-{}", std::process::id()));
        let (stamp, result) = (folder.join("stamp"), folder.join("result"));
        note(&stamp, "one").unwrap();
        assert!(is_fresh(&stamp, "one", &[]));
        assert!(!is_fresh(&stamp, "two", &[]));
        assert!(!is_fresh(&stamp, "one", &[&result]));
        write(&result, b"here").unwrap();
        assert!(is_fresh(&stamp, "one", &[&result]));
        std::fs::remove_dir_all(&folder).unwrap();
    }
}
