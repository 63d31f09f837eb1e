// The whole holding model, by full Bayes. Effects are non-centred.
data {
  int<lower=1> N;
  vector[N] lo;                       // ln held - known part - centre; used where has_lo
  vector[N] hi;                       // ln moved - known part - centre; used where has_hi
  int<lower=0, upper=1> has_lo[N];
  int<lower=0, upper=1> has_hi[N];
  vector[N] lnm;
  int<lower=1> S; int<lower=1, upper=S> seabed[N];
  int<lower=1> F; int<lower=1, upper=F> fam[N];
  int<lower=1> A; int<lower=1, upper=A> design[N];
  int<lower=1> G; int<lower=1, upper=G> ds[N];
  int<lower=1> Q; int<lower=0, upper=Q> mod[N];
  int<lower=1> M; int<lower=0, upper=M> mods[N];
  int<lower=1> T; int<lower=1, upper=T> trial[N];
  int<lower=1> W; int<lower=1, upper=W> day[N];
  int<lower=1> K; int<lower=1, upper=K> rig[N];
}
parameters {
  vector[S] mu; vector[S] beta; vector[K] v;
  vector[F] zf; vector[A] za; vector[G] zg; vector[Q] zq; vector[M] zm; vector[T] zt; vector[W] zw;
  vector<lower=0>[7] tau;
  real<lower=0> sigma;
}
transformed parameters {
  vector[F] f = tau[1] * zf; vector[A] a = tau[2] * za; vector[G] g = tau[3] * zg;
  vector[Q] q = tau[4] * zq; vector[M] m = tau[5] * zm;
}
model {
  mu ~ normal(0, 2); beta ~ normal(0, 0.1); v ~ normal(0, 0.1);
  zf ~ std_normal(); za ~ std_normal(); zg ~ std_normal(); zq ~ std_normal(); zm ~ std_normal(); zt ~ std_normal(); zw ~ std_normal();
  tau ~ normal(0, 0.5); sigma ~ normal(0, 1);
  for (i in 1:N) {
    real eta = mu[seabed[i]] + beta[seabed[i]] * lnm[i] + f[fam[i]] + a[design[i]] + g[ds[i]]
      + tau[6] * zt[trial[i]] + tau[7] * zw[day[i]] + v[rig[i]];
    if (mod[i] > 0) eta += q[mod[i]] + m[mods[i]];
    if (has_lo[i] && has_hi[i]) {
      if (lo[i] > eta) target += log_diff_exp(normal_lccdf(lo[i] | eta, sigma), normal_lccdf(hi[i] | eta, sigma));
      else target += log_diff_exp(normal_lcdf(hi[i] | eta, sigma), normal_lcdf(lo[i] | eta, sigma));
    } else if (has_lo[i]) target += normal_lccdf(lo[i] | eta, sigma);
    else target += normal_lcdf(hi[i] | eta, sigma);
  }
}
