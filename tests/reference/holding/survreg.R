# One free mean for each design and seabed, one sigma: survival::survreg on interval-censored lognormal data.
library(survival)
source("common.R")
d <- read_pulls("freeMeansPulls.csv")
d$cell <- paste(d$design, d$seabed)
lo <- ifelse(d$heldN == 0, NA, d$heldN)
hi <- d$movedN
open <- tapply(is.na(hi), d$cell, all) | tapply(is.na(lo), d$cell, all)
keep <- !open[d$cell]
d <- d[keep, ]; lo <- lo[keep]; hi <- hi[keep]
fit <- survreg(Surv(lo, hi, type = "interval2") ~ 0 + cell + offset(known), data = d, dist = "lognormal",
               control = survreg.control(rel.tolerance = 1e-12, maxiter = 100))
se <- sqrt(diag(vcov(fit)))[seq_along(coef(fit))]
write.csv(rbind(data.frame(cell = sub("^cell", "", names(coef(fit))), mean = format(coef(fit), digits = 12), se = format(se, digits = 10)),
                data.frame(cell = "sigma", mean = format(fit$scale, digits = 12), se = "")),
          "survreg.csv", row.names = FALSE, quote = FALSE)
cat(R.version.string, "survival", as.character(packageVersion("survival")), "\n")
