# Quantiles and tails of gamma and beta where libraries fail: very small and very large shapes.
# R 4.2.2 stats::qgamma, pgamma, qbeta, pbeta. Run from the root of the repository:
#   Rscript tests/golden/scripts/gen_i_tails.R > tests/golden/tails.json
P <- c(1e-12, 1e-6, 0.001, 0.1, 0.5, 0.9, 0.999, 1 - 1e-6)
num <- function(x) paste0("[", paste(sprintf("%.17g", x), collapse = ","), "]")
one <- function(params, x, cdf, sf) sprintf('{%s,"x":%s,"cdf":%s,"sf":%s}', params, num(x), num(cdf), num(sf))
g <- sapply(c(0.05, 0.5, 2, 50, 99, 100, 101, 500, 999, 1000, 5000, 1e5, 1e6), function(a) { x <- qgamma(P, a)
  one(sprintf('"shape":%.17g', a), x, pgamma(x, a), pgamma(x, a, lower.tail = FALSE)) })
b <- sapply(list(c(.05, 4), c(.5, .5), c(2, 8), c(35, 65), c(2000, 3), c(1e4, 1e4), c(1e5, 10), c(.2, .3), c(1, 1), c(1, 30), c(300, 700), c(3, 50000)),
  function(s) { x <- qbeta(P, s[1], s[2])
  one(sprintf('"alpha":%.17g,"beta":%.17g', s[1], s[2]), x, pbeta(x, s[1], s[2]), pbeta(x, s[1], s[2], lower.tail = FALSE)) })
cat(sprintf('{"file":"tails.json","source":"R %s stats::qgamma, pgamma, qbeta, pbeta; scripts/gen_i_tails.R","p":%s,\n"gamma":[\n%s],\n"beta":[\n%s]}\n',
  as.character(getRversion()), num(P), paste(g, collapse = ",\n"), paste(b, collapse = ",\n")))
