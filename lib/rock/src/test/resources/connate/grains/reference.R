# Reference values for grain-size curves, by base R: approx() on the cumulative curve for the
# percentiles, weighted sums for the moments, integrate() for the harmonic means.
# Run: Rscript reference.R > reference.csv
set.seed(42)
limits <- c(0.002, 0.016, 0.063, 0.125, 0.18, 0.25, 0.355, 0.5, 0.71, 1, 2) # mm
n <- length(limits) - 1
cat("curve,", paste0("w", 1:n, collapse = ","), ",d10,d50,d60,d10linear,mean,sorting,skewness,kurtosis,",
    "m1,m2,m3,m4,kruger,zunker,zamarin\n", sep = "")
for (curve in 1:12) {
  w <- rgamma(n, shape = dnorm(1:n, runif(1, 4, 8), runif(1, 1, 3)) * 12 + 0.05)
  w <- round(100 * w / sum(w), 2)
  w[which.max(w)] <- w[which.max(w)] + 100 - sum(w)
  cum <- c(0, cumsum(w))
  d <- function(p) exp(approx(cum, log(limits), p, ties = "ordered")$y)
  lin <- function(p) approx(cum, limits, p, ties = "ordered")$y
  phi <- function(p) -log2(d(100 - p))
  mz <- (phi(16) + phi(50) + phi(84)) / 3
  si <- (phi(84) - phi(16)) / 4 + (phi(95) - phi(5)) / 6.6
  sk <- (phi(16) + phi(84) - 2 * phi(50)) / (2 * (phi(84) - phi(16))) +
    (phi(5) + phi(95) - 2 * phi(50)) / (2 * (phi(95) - phi(5)))
  kg <- (phi(95) - phi(5)) / (2.44 * (phi(75) - phi(25)))
  mid <- -(log2(limits[-1]) + log2(limits[-(n + 1)])) / 2
  p <- w / 100
  m1 <- sum(p * mid); m2 <- sqrt(sum(p * (mid - m1)^2))
  m3 <- sum(p * (mid - m1)^3) / m2^3; m4 <- sum(p * (mid - m1)^4) / m2^4
  mean_inverse <- function(to, from) sum(sapply(1:n, function(i) {
    a <- to(limits[i]); b <- to(limits[i + 1])
    p[i] * integrate(function(x) 1 / from(x), a, b, rel.tol = 1e-12)$value / (b - a)
  }))
  kruger <- 1 / sum(p / ((limits[-1] + limits[-(n + 1)]) / 2))
  out <- c(w, d(10), d(50), d(60), lin(10), mz, si, sk, kg, m1, m2, m3, m4, kruger,
           1 / mean_inverse(log, exp), 1 / mean_inverse(identity, identity))
  cat(curve, sprintf("%.12g", out), sep = ",")
  cat("\n")
}
