//! Rotation of the axes of a Cartesian system.

use crate::quantity::sin_cos;

/// Turns the coordinates of a vector from one set of axes into those of another.
#[derive(Debug, Clone, Copy, PartialEq)]
pub struct Matrix {
    rows: [[f64; 3]; 3],
}

impl Matrix {
    /// The axes turned about the x axis by an angle, counter-clockwise seen from its tip.
    pub(crate) fn about_x(angle_rad: f64) -> Self {
        let (sin, cos) = sin_cos(angle_rad);
        Self {
            rows: [[1.0, 0.0, 0.0], [0.0, cos, sin], [0.0, -sin, cos]],
        }
    }

    /// The axes turned about the z axis by an angle, counter-clockwise seen from its tip.
    pub(crate) fn about_z(angle_rad: f64) -> Self {
        let (sin, cos) = sin_cos(angle_rad);
        Self {
            rows: [[cos, sin, 0.0], [-sin, cos, 0.0], [0.0, 0.0, 1.0]],
        }
    }

    /// This rotation and after it another.
    pub(crate) fn then(self, next: Matrix) -> Self {
        let mut rows = [[0.0; 3]; 3];
        for (row, factors) in rows.iter_mut().zip(next.rows) {
            for (column, value) in row.iter_mut().enumerate() {
                *value = (0..3).map(|k| factors[k] * self.rows[k][column]).sum();
            }
        }
        Self { rows }
    }

    /// The vector on the new axes.
    pub fn apply(&self, vector: [f64; 3]) -> [f64; 3] {
        self.rows
            .map(|row| row[0] * vector[0] + row[1] * vector[1] + row[2] * vector[2])
    }

    /// The vector carried back from the new axes to the old ones.
    pub fn apply_back(&self, vector: [f64; 3]) -> [f64; 3] {
        [0, 1, 2].map(|column| (0..3).map(|row| self.rows[row][column] * vector[row]).sum())
    }

    /// The rows: the new axes, given on the old ones.
    pub fn rows(&self) -> [[f64; 3]; 3] {
        self.rows
    }
}

#[cfg(test)]
mod tests {
    use super::*;

    #[test]
    fn turning_forth_and_back_changes_nothing() {
        let matrix = Matrix::about_x(0.3)
            .then(Matrix::about_z(-1.1))
            .then(Matrix::about_x(2.0));
        let vector = [0.3, -0.7, 1.9];
        let back = matrix.apply_back(matrix.apply(vector));
        for axis in 0..3 {
            assert!((back[axis] - vector[axis]).abs() < 1e-15);
        }
    }

    #[test]
    fn axes_turn_counter_clockwise() {
        let turned = Matrix::about_z(std::f64::consts::FRAC_PI_2).apply([1.0, 0.0, 0.0]);
        assert!((turned[1] + 1.0).abs() < 1e-15);
    }
}
