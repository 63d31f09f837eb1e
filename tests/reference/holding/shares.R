# Shares of several designs under a shared Beta(m pi, m (1 - pi)) prior, pi and m/(1 + m) uniform: integrated on a fine grid, quantiles
# of the exact mixture.
y <- c(0, 2, 5, 7, 3, 9); n <- c(6, 8, 9, 7, 4, 12)
size <- 400; pi <- (1:size - 0.5) / size; u <- (1:size - 0.5) / size
loglik <- function(p, q) { m <- q / (1 - q); sum(lbeta(m * p + y, m * (1 - p) + n - y) - lbeta(m * p, m * (1 - p))) }
L <- outer(pi, u, Vectorize(loglik))
W <- exp(L - max(L)); W <- W / sum(W)
M <- matrix(rep(u / (1 - u), each = size), size); A <- M * matrix(rep(pi, size), size); B <- M - A
keep <- order(-W)[1:40000]
quantile_of <- function(i, p) uniroot(function(x)
  sum(W[keep] * pbeta(x, A[keep] + y[i], B[keep] + n[i] - y[i])) / sum(W[keep]) - p, c(1e-9, 1 - 1e-9), tol = 1e-9)$root
out <- data.frame(successes = y, trials = n, mean = sapply(seq_along(y), function(i) sum(W * (A + y[i]) / (M + n[i]))),
                  low90 = sapply(seq_along(y), quantile_of, 0.05), high90 = sapply(seq_along(y), quantile_of, 0.95))
write.csv(format(out, digits = 8), "shares.csv", row.names = FALSE, quote = FALSE)
cat(R.version.string, "\n")
