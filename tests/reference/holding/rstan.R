# Full Bayes on the whole model: means and sds of every design on every seabed at 15 kg, of the modifications, and of the sds.
library(rstan)
rstan_options(boost_lib = "/usr/include")
source("common.R")
d <- read_pulls("wholeModelPulls.csv")
centre <- mean(log(ifelse(is.na(d$movedN), d$heldN, ifelse(d$heldN == 0, d$movedN / 2, sqrt(d$heldN * d$movedN)))))
index <- function(x) as.integer(factor(x))
all_pairs <- function(x, y) paste(x, y)
seabeds <- sort(unique(d$seabed)); designs <- sort(unique(d$design))
family_of <- sapply(designs, function(k) d$family[d$design == k][1])
cells <- expand.grid(design = designs, seabed = seabeds, stringsAsFactors = FALSE)
fam_levels <- sort(unique(all_pairs(family_of[cells$design], cells$seabed)))
ds_levels <- all_pairs(cells$design, cells$seabed)
modified <- d$modification != ""
q_levels <- sort(unique(all_pairs(d$design, d$modification)[modified]))
m_levels <- sort(unique(paste(d$design, d$modification, d$seabed)[modified]))
zero <- function(x) ifelse(is.na(x), 0L, as.integer(x))
data <- list(N = nrow(d), lo = ifelse(d$heldN == 0, 0, log(pmax(d$heldN, 1)) - d$known - centre),
  hi = ifelse(is.na(d$movedN), 0, log(ifelse(is.na(d$movedN), 1, d$movedN)) - d$known - centre),
  has_lo = as.integer(d$heldN > 0), has_hi = as.integer(!is.na(d$movedN)), lnm = d$lnm,
  S = length(seabeds), seabed = match(d$seabed, seabeds), F = length(fam_levels), fam = match(all_pairs(d$family, d$seabed), fam_levels),
  A = length(designs), design = match(d$design, designs), G = length(ds_levels), ds = match(all_pairs(d$design, d$seabed), ds_levels),
  Q = length(q_levels), mod = ifelse(modified, zero(match(all_pairs(d$design, d$modification), q_levels)), 0L),
  M = length(m_levels), mods = ifelse(modified, zero(match(paste(d$design, d$modification, d$seabed), m_levels)), 0L),
  T = length(unique(d$trial)), trial = index(d$trial), W = length(unique(paste(d$trial, d$design))), day = index(paste(d$trial, d$design)),
  K = length(unique(d$rig)), rig = index(d$rig))
fit <- stan("holding.stan", data = data, chains = 2, cores = 1, warmup = 800, iter = 3300, seed = 7, refresh = 500,
            control = list(adapt_delta = 0.95))
draws <- extract(fit)
row <- function(kind, name, x) data.frame(kind = kind, name = name, mean = format(mean(x), digits = 7), sd = format(sd(x), digits = 6))
out <- list()
for (i in seq_len(nrow(cells))) {
  s <- match(cells$seabed[i], seabeds); a <- match(cells$design[i], designs)
  f <- match(all_pairs(family_of[cells$design[i]], cells$seabed[i]), fam_levels)
  out[[length(out) + 1]] <- row("cell", ds_levels[i], centre + draws$mu[, s] + draws$f[, f] + draws$a[, a] + draws$g[, i])
}
for (k in seq_along(m_levels)) {
  parts <- strsplit(m_levels[k], " ")[[1]]
  out[[length(out) + 1]] <- row("ratio", m_levels[k], draws$q[, match(all_pairs(parts[1], parts[2]), q_levels)] + draws$m[, k])
}
names7 <- c("family", "design", "designSeabed", "modification", "modificationSeabed", "trial", "anchorDay")
for (k in 1:7) out[[length(out) + 1]] <- row("sd", names7[k], draws$tau[, k])
out[[length(out) + 1]] <- row("sd", "sigma", draws$sigma)
for (s in seq_along(seabeds)) out[[length(out) + 1]] <- row("beta", seabeds[s], draws$beta[, s])
write.csv(do.call(rbind, out), "rstan.csv", row.names = FALSE, quote = FALSE)
check <- summary(fit)$summary
cat(R.version.string, "rstan", as.character(packageVersion("rstan")), "max Rhat", max(check[, "Rhat"], na.rm = TRUE),
    "least n_eff", min(check[, "n_eff"], na.rm = TRUE), "divergent", get_num_divergent(fit), "\n")
