# Reference values for the tests of calibration and chance, by base R and its package boot.
# Run: Rscript reference.R > reference.csv   (R 4.2.2, boot 1.3-28.1)
options(digits = 12)
out <- function(name, value) cat(sprintf("%s,%.12g,R 4.2.2\n", name, value))
cat("name,value,source\n")

# multiple regression on the data set rock (BP Research; datasets package)
m <- lm(log(perm) ~ area + peri + shape, rock)
cf <- coef(summary(m))
for (i in 1:4) for (j in 1:4)
  out(paste("rock", rownames(cf)[i], c("coef", "se", "t", "p")[j]), cf[i, j])
out("rock s", summary(m)$sigma)
out("rock r2", summary(m)$r.squared)
out("rock adjusted r2", summary(m)$adj.r.squared)
out("rock rss", sum(resid(m)^2))
out("rock F", summary(m)$fstatistic[[1]])
out("rock aic", AIC(m))
out("rock logLik", as.numeric(logLik(m)))
out("rock press", sum((resid(m) / (1 - hatvalues(m)))^2))
pr <- predict(m, data.frame(area = 5000, peri = 3000, shape = 0.2), interval = "prediction", level = 0.8)
out("rock prediction fit", pr[1]); out("rock prediction low", pr[2]); out("rock prediction high", pr[3])
out("rock smearing", mean(exp(resid(m))))
core <- rep(1:12, each = 4)
held <- unlist(lapply(1:12, function(g) {
  f <- lm(log(perm) ~ area + peri + shape, rock[core != g, ])
  log(rock$perm[core == g]) - predict(f, rock[core == g, ])
}))
out("rock leave core out rmse", sqrt(mean(held^2)))
out("rock leave one out rmse", sqrt(mean((resid(m) / (1 - hatvalues(m)))^2)))
x <- rock$peri; y <- log(rock$perm)
out("rock rma slope", sign(cor(x, y)) * sd(y) / sd(x))

# two overlapping groups: maximum likelihood by a general optimiser, not by expectation-maximisation
g <- c(qnorm((1:60 - 0.5) / 60, -0.5, 0.3), qnorm((1:40 - 0.5) / 40, 0.6, 0.25))
nll <- function(p) -sum(log(plogis(p[1]) * dnorm(g, p[2], exp(p[3])) +
                            (1 - plogis(p[1])) * dnorm(g, p[4], exp(p[5]))))
o <- optim(c(0, -0.5, log(0.3), 0.6, log(0.25)), nll, method = "BFGS",
           control = list(reltol = 1e-15, maxit = 5000))
o <- optim(o$par, nll, method = "BFGS", control = list(reltol = 1e-16, maxit = 5000))
out("mixture weight 1", plogis(o$par[1])); out("mixture mean 1", o$par[2])
out("mixture sd 1", exp(o$par[3])); out("mixture mean 2", o$par[4])
out("mixture sd 2", exp(o$par[5])); out("mixture logLik", -o$value)

# bootstrap of the plug-in variance, spatial test data A of Efron and Tibshirani (1993), table 14.2
library(boot)
a <- c(48,36,20,29,42,42,20,42,22,41,45,14,6,0,33,28,34,4,32,24,47,41,24,26,30,41)
set.seed(1)
b <- boot(a, function(d, i) mean((d[i] - mean(d[i]))^2), R = 200000)
z0 <- qnorm(mean(b$t < b$t0) + 0.5 * mean(b$t == b$t0))
out("bca z0", z0)
L <- sapply(seq_along(a), function(i) mean((a[-i] - mean(a[-i]))^2)); d <- mean(L) - L
acc <- sum(d^3) / (6 * sum(d^2)^1.5); out("bca acceleration", acc)
q <- function(al) { z <- z0 + qnorm(al); pnorm(z0 + z / (1 - acc * z)) }
out("bca low", quantile(b$t, q(0.05))[[1]]); out("bca high", quantile(b$t, q(0.95))[[1]])
out("percentile low", quantile(b$t, 0.05)[[1]]); out("percentile high", quantile(b$t, 0.95)[[1]])

# laws of chance
tn <- function(p, m, s, a, b) qnorm(pnorm((a - m) / s) + p * (pnorm((b - m) / s) - pnorm((a - m) / s))) * s + m
out("truncated normal q05", tn(0.05, 0.35, 0.1, 0.1, 0.5)); out("truncated normal q90", tn(0.9, 0.35, 0.1, 0.1, 0.5))
f <- function(x) x * dnorm(x, 0.35, 0.1)
out("truncated normal mean", integrate(f, 0.1, 0.5, rel.tol = 1e-12)$value / (pnorm(0.5, 0.35, 0.1) - pnorm(0.1, 0.35, 0.1)))
out("lognormal q10", qlnorm(0.1, log(10), 1.2))
out("quantile type 7 p10", quantile(rock$perm, 0.1, type = 7)[[1]])
out("quantile type 6 p10", quantile(rock$perm, 0.1, type = 6)[[1]])
