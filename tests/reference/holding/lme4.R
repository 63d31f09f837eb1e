# The same random terms by maximum likelihood on nearly exact values.
library(lme4)
source("common.R")
d <- read_pulls("exactPulls.csv")
d$y <- 0.5 * (log(d$heldN) + log(d$movedN)) - d$known
fit <- lmer(y ~ 0 + seabed + seabed:lnm + (1 | family:seabed) + (1 | design) + (1 | design:seabed) + (1 | trial) + (1 | trial:design),
            data = d, REML = FALSE, control = lmerControl(optimizer = "bobyqa", optCtrl = list(rhoend = 1e-9)))
sds <- as.data.frame(VarCorr(fit))
write.csv(rbind(data.frame(name = names(fixef(fit)), value = format(fixef(fit), digits = 10)),
                data.frame(name = paste("sd", sds$grp), value = format(sds$sdcor, digits = 10))),
          "lme4.csv", row.names = FALSE, quote = FALSE)
cat(R.version.string, "lme4", as.character(packageVersion("lme4")), "\n")
print(sds); print(fixef(fit))
