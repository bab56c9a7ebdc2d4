//! Reading how many tests passed and failed from what the runners print.

use std::ops::AddAssign;

/// Tests that passed and failed. A skipped test counts as failed: this project has none.
#[derive(Debug, Clone, Copy, Default, PartialEq, Eq)]
pub struct Counts {
    pub passed: u64,
    pub failed: u64,
}

impl AddAssign for Counts {
    fn add_assign(&mut self, other: Self) {
        self.passed += other.passed;
        self.failed += other.failed;
    }
}

impl Counts {
    pub const PASSED: Self = Self {
        passed: 1,
        failed: 0,
    };
    pub const FAILED: Self = Self {
        passed: 0,
        failed: 1,
    };

    /// The last line of a test run.
    pub fn closing_line(self) -> String {
        format!("{} passed, {} failed", self.passed, self.failed)
    }

    /// A runner that ended badly without a failed test (it did not build, or died) counts as one failure, and so
    /// does one that ran nothing.
    pub fn confirmed(mut self, success: bool) -> Self {
        if self.failed == 0 && (!success || self.passed == 0) {
            self.failed = 1;
        }
        self
    }
}

/// Sums the `test result:` lines of `cargo test`.
pub fn of_cargo(output: &str) -> Counts {
    let mut sum = Counts::default();
    for line in output.lines() {
        let Some(result) = line.trim().strip_prefix("test result: ") else {
            continue;
        };
        for part in result.split(['.', ';']) {
            match part.trim().split_once(' ') {
                Some((number, "passed")) => sum.passed += number.parse().unwrap_or(0),
                Some((number, "failed" | "ignored")) => sum.failed += number.parse().unwrap_or(0),
                _ => {}
            }
        }
    }
    sum
}

/// Reads the summary of `node --test`, as its spec and tap reporters print it.
pub fn of_node(output: &str) -> Counts {
    let mut sum = Counts::default();
    for line in output.lines() {
        let Some(summary) = line.strip_prefix("ℹ ").or_else(|| line.strip_prefix("# ")) else {
            continue;
        };
        let number = |text: &str| text.trim().parse::<u64>().unwrap_or(0);
        match summary.split_once(' ') {
            Some(("pass", text)) => sum.passed += number(text),
            Some(("fail" | "cancelled" | "skipped" | "todo", text)) => sum.failed += number(text),
            _ => {}
        }
    }
    sum
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn cargo_results_are_summed_over_test_programs() {
        let output = "running 2 tests\ntest a ... ok\n\
            test result: ok. 2 passed; 0 failed; 0 ignored; 0 measured; 0 filtered out; finished in 0.01s\n\
            test result: FAILED. 30 passed; 3 failed; 1 ignored; 0 measured; 2 filtered out; finished in 0.01s\n";
        assert_eq!(
            of_cargo(output),
            Counts {
                passed: 32,
                failed: 4
            }
        );
    }

    #[test]
    fn node_results_of_both_reporters() {
        let spec = "✔ pass 9 things (1 ms)\nℹ tests 5\nℹ suites 0\nℹ pass 2\nℹ fail 1\nℹ cancelled 0\nℹ skipped 1\nℹ todo 1\nℹ duration_ms 4\n";
        assert_eq!(
            of_node(spec),
            Counts {
                passed: 2,
                failed: 3
            }
        );
        assert_eq!(
            of_node("ok 1 - x\n# tests 1\n# pass 1\n# fail 0\n"),
            Counts::PASSED
        );
    }

    #[test]
    fn a_runner_without_results_is_a_failure() {
        assert_eq!(
            of_cargo("error: could not compile").confirmed(false),
            Counts::FAILED
        );
        assert_eq!(Counts::default().confirmed(true), Counts::FAILED);
        assert_eq!(
            Counts {
                passed: 3,
                failed: 0
            }
            .confirmed(false),
            Counts {
                passed: 3,
                failed: 1
            }
        );
        assert_eq!(
            Counts {
                passed: 3,
                failed: 2
            }
            .confirmed(false),
            Counts {
                passed: 3,
                failed: 2
            }
        );
        assert_eq!(Counts::PASSED.confirmed(true), Counts::PASSED);
    }

    #[test]
    fn the_closing_line_is_plain() {
        assert_eq!(
            Counts {
                passed: 41,
                failed: 0
            }
            .closing_line(),
            "41 passed, 0 failed"
        );
    }
}
