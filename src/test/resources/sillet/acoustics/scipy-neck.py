# Independent reckoning of a robust maximum a posteriori estimate of two strings on one neck.
import sys, numpy as np, scipy
from scipy.optimize import least_squares, brentq
C = 1200/np.log(2); JOINT = 15; FIRST = 1-2**(-1/12)
P = dict(saddle_cents=10, nut=2.5e-4, slot=3e-5, fret=3.5e-5, held=.2, held_open=.1, share=.3, press_m=7e-5,
         press=.4, press_own=.5, after_share=.028, after=.5, after_own=.7, action_own=1.2e-4, gap_own=4e-5,
         stray=.14, stray_count=5, body=.15, body_count=2, body_width=1, believed=2.5)
G = lambda n: 2**(n/12)
def tension(mu, EI, L, f, alpha):
    def off(T):
        d = np.sqrt(EI/T); Le = L-alpha*d
        return 1/(2*Le)*np.sqrt(T/mu*(1+(np.pi*d/Le)**2))-f
    T0 = mu*(2*L*f)**2
    return brentq(off, .3*T0, 1.2*T0, xtol=1e-12, rtol=1e-14)
def cents(S, frets):
    X, s, m = S['scale'], S['saddle'], S['nut']
    h12, h1, rel = S['action'], S['gap'], S['relief']
    def bow(n):
        if n <= 1 or n >= JOINT: return 0.
        u = (1-1/G(n)-FIRST)/(1-1/G(JOINT)-FIRST)
        return 4*rel*u*(1-u)
    c = (h12-bow(12)-h1)/(.5-FIRST); b = h1-FIRST*c
    L0 = np.hypot(X+s+m, c); T0 = tension(S['mu'], S['EI'], L0, S['hz'], S['open'])
    out = []
    for n in frets:
        # points from the saddle to the nut, heights over the top of this fret
        bn = b+bow(n); Ln = np.hypot(X/G(n)+s, bn+c)
        space = X*(1/G(n-1)-1/G(n)); d = S['share']*space
        below = (bn+c)*d/(X/G(n)+s)+S['press']
        behind = X-X/G(n)+m
        line = -below+(bn+below)*(space-d)/(behind-d)      # over the fret before
        if line < 0 and behind-space > 0:
            back = np.hypot(space-d, below)+np.hypot(behind-space, bn)
        else:
            back = np.hypot(behind-d, bn+below)
        Q = (Ln+np.hypot(d, below)+back-L0)/L0
        T = T0+S['grip']*S['EA']*Q; de = np.sqrt(S['EI']/T); Le = Ln-S['fretted']*de
        f = 1/(2*Le)*np.sqrt(T*(1+Q)/S['mu']*(1+(np.pi*de/Le)**2))
        out.append(C*np.log(f/(S['hz']*G(n)))-C*np.log(1-S['place'].get(n, 0)/(X/G(n)+s)))
    return np.array(out)

STRINGS = [dict(hz=195.9977, scale=.648, mu=1.149542e-3, EA=29287.69, EI=3.412954e-4, sd=.03, action=1.6e-3, gap=.42e-3, relief=.2e-3),
           dict(hz=82.4069, scale=.648, mu=7.635858e-3, EA=32834.64, EI=4.289679e-4, sd=.24, action=1.9e-3, gap=.5e-3, relief=.2e-3)]
HSD = (8e-5, 2.5e-5, 3e-5)
READ = [1, 2, 3, 5, 7, 9, 12, 15, 17]; SD = .4
DATA = [[3.1, 2.6, 2.5, 1.9, 6.9, 1.0, 0.4, -1.6, -2.1], [2.6, 2.4, 1.4, 1.9, 1.2, 1.6, 1.1, 0.9, 1.5]]

class Unknowns:
    def __init__(self):
        self.names, self.sd = [], []
    def __call__(self, name, sd):
        if sd == 0: return None
        if name not in self.names: self.names.append(name); self.sd.append(sd)
        return self.names.index(name)
def spread(rel):  # core, modulus, bending, mass
    return (0, rel, 0, .01) if rel <= .05 else (rel/2, 0, 0, .01)
U = Unknowns()
def situation(i, x, sd, base):
    S0 = STRINGS[i]
    v = lambda name, s: 0. if s == 0 else x[U(name, s)]*sd[U(name, s)]
    core, mod, ben, mass = spread(S0['sd'])
    core, mod, ben, mass = (v((k, i), s) for k, s in zip(('core', 'modulus', 'bending', 'mass'), spread(S0['sd'])))
    held = 1+v('held', P['held']); ho = v('held_open', P['held_open'])
    after = np.log(P['after_share'])+v('after', P['after'])+v(('after', i), P['after_own'])
    press = P['press_m']*np.exp(v('press', P['press'])+v(('press', i), P['press_own']))
    def height(kind, typed, s, own):
        o = min(s, own); sh = np.sqrt(max(0., s*s-o*o))
        return typed+v((kind, i), o)+(v(kind, sh) if sh > 1e-15 else 0)
    return dict(hz=S0['hz'], scale=S0['scale'], mu=S0['mu']*np.exp(mass), EA=S0['EA']*np.exp(2*core+mod),
        EI=S0['EI']*np.exp(4*core+mod+ben), saddle=base[i]+v(('saddle', i), P['saddle_cents']*S0['scale']/C),
        nut=v('nut', P['nut'])+v(('slot', i), P['slot']),
        action=height('action', S0['action'], HSD[0], P['action_own']), gap=height('gap', S0['gap'], HSD[1], P['gap_own']),
        relief=S0['relief']+v('relief', HSD[2]), fretted=held, open=held+ho, grip=1/(1+np.exp(after)), press=press,
        share=P['share'], place={n: v(('fret', n), P['fret']) for n in READ})
class Zero(dict):
    def __getitem__(self, k): return 0.
base = [0., 0.]
for i in range(2): situation(i, Zero(), Zero(), base)  # names the unknowns
# what the body does to a pitch, cents at an open string of mean mass; alike at pitches that are near
number = lambda hz: int(round(12*np.log2(hz/440)))
low = min(number(S['hz']) for S in STRINGS); high = max(number(S['hz'])+max(READ) for S in STRINGS)
K = high-low+1; OWN = len(U.names)
for k in range(K): U(('body', k), P['body'])
N = len(U.names)
gap = np.subtract.outer(np.arange(K), np.arange(K))/P['body_width']
ROOT = np.linalg.cholesky(1/(1+gap**2)+1e-6*np.eye(K))
MASS = np.mean([S['mu']*S['scale'] for S in STRINGS])
def body(i, x, sd, frets):
    by_pitch = ROOT@(sd[OWN:]*x[OWN:]); S = STRINGS[i]; m = S['mu']*S['scale']/MASS; o = number(S['hz'])-low
    return np.array([m*by_pitch[o]-m/G(n)*by_pitch[o+n] for n in frets])
for i in range(2):
    z = np.zeros(N); s = np.array(U.sd)
    def off(p):
        b = list(base); b[i] = p; return cents(situation(i, z, s, b), [12])[0]
    base[i] = brentq(off, -.005, .02, xtol=1e-14)
def sds(stray, yields):
    sd = np.array(U.sd, float)
    for k, n in enumerate(U.names):
        if n[0] == 'slot': sd[k] = np.hypot(P['slot'], stray*.648/C)
    sd[OWN:] = yields
    return sd
def model(x, sd, frets=READ):
    return np.concatenate([cents(situation(i, x, sd, base), frets)+body(i, x, sd, frets) for i in range(2)])
Y = np.concatenate(DATA)
def weight(r, stray):
    u = np.abs(r)/np.hypot(SD, stray); return np.minimum(1, (P['believed']/np.maximum(u, 1e-300))**2)
def rho(r, stray):
    c = P['believed']; S2 = SD**2+stray**2; u2 = r*r/S2; a = SD**2/(c*c*S2)
    return np.where(u2 <= c*c, u2, c*c+(np.log(a*r*r+stray**2)-np.log(S2))/a)
def jac(x, sd, frets=READ):
    J = np.zeros((2*len(frets), N)); h = 1e-4
    for k in range(N):
        e = np.zeros(N); e[k] = h
        J[:, k] = (model(x+e, sd, frets)-model(x-e, sd, frets))/(2*h)
    return J
stray = P['stray']; yields = P['body']; x = np.zeros(N)
for rounds in range(200):
    sd = sds(stray, yields)
    fun = lambda v: np.concatenate([v, (lambda r: np.sign(r)*np.sqrt(rho(r, stray)))(Y-model(v, sd))])
    fit = least_squares(fun, x, method='trf', xtol=1e-13, ftol=1e-13, gtol=1e-13, jac='3-point')
    x = fit.x; r = Y-model(x, sd); w = weight(r, stray); J = jac(x, sd)
    p = w/SD**2; lam = 1/(1/p+stray**2); H = np.eye(N)+J.T@(lam[:, None]*J); V = np.linalg.inv(H)
    left = stray**2/(1+stray**2*p); g = left*p
    # fixed point of evidence: squares over how many of them the readings determine
    unsure = (left+g**2*np.einsum('ij,jk,ik->i', J, V, J))/stray**2
    new = np.sqrt((P['stray_count']*P['stray']**2+np.sum((g*r)**2))/(P['stray_count']+np.sum(np.maximum(0, 1-unsure))))
    more = np.sqrt((P['body_count']*P['body']**2+np.sum((sd[OWN:]*x[OWN:])**2))/(P['body_count']+np.sum(np.maximum(0, 1-np.diag(V)[OWN:]))))
    done = abs(new-stray) < 1e-9 and abs(more-yields) < 1e-9
    slot = [k for k, n in enumerate(U.names) if n[0] == 'slot']
    x = x*sds(stray, yields)/sds(new, more); stray = new; yields = more
    if done: break
print('rounds', rounds, 'stray', stray, 'body', yields, 'wild weight', w.min())
assert all(abs(x[k]) < P['believed'] for k, n in enumerate(U.names) if n[0] in ('fret', 'slot'))
sd = sds(stray, yields)
frets = list(range(1, 13))
JJ = jac(x, sd, frets); cc = model(x, sd, frets)
rows = []
for i in range(2):
    for n in frets:
        k = i*12+n-1; row = JJ[k].copy(); val = cc[k]; own = stray**2
        if n in READ:
            q = i*len(READ)+READ.index(n); val += g[q]*r[q]; row -= g[q]*J[q]; own = left[q]
        else:
            own += (P['fret']*C*G(n)/.648/(1+situation(i, x, sd, base)['saddle']*G(n)/.648))**2
        rows.append((i+1, n, val, np.sqrt(row@V@row+own)))
sit = [situation(i, x, sd, base) for i in range(2)]
for i in range(2):
    k = U.names.index(('saddle', i)); print('saddle', sit[i]['saddle'], 'sd', sd[k]*np.sqrt(V[k, k]))
k = U.names.index('nut'); print('nut', x[k]*sd[k], sd[k]*np.sqrt(V[k, k]))
for a in rows: print(*a)
OUT = sys.argv[1] if len(sys.argv) > 1 else '.'
HEAD = '''# Robust maximum a posteriori estimate of two strings on one neck, nine frets read, one reading wild (string 1, fret 7: about 5 cents too high),
# by a program that shares no code with this one: scipy-neck.py beside this file, scipy.optimize.least_squares and brentq,
# numpy %s, scipy %s, Python %s [D]. Loss: square up to 2.5 sd of a reading about the curve, beyond it the reading's own variance
# grows as the square of its distance; straying of notes and yielding of the body by the fixed point of the evidence.
''' % (np.__version__, scipy.__version__, sys.version.split()[0])
with open(OUT+'/scipy-neck-notes.csv', 'w') as f:
    f.write(HEAD+'# True note against the open string and its sd, cents.\nstring,fret,cents,sd\n')
    for a in rows: f.write('%d,%d,%.5f,%.5f\n' % a)
with open(OUT+'/scipy-neck-figures.csv', 'w') as f:
    f.write(HEAD+'figure,value,sd\n')
    for i in range(2):
        k = U.names.index(('saddle', i)); f.write('saddle %d mm,%.5f,%.5f\n' % (i+1, 1e3*sit[i]['saddle'], 1e3*sd[k]*np.sqrt(V[k, k])))
    k = U.names.index('nut'); f.write('nut mm,%.5f,%.5f\n' % (1e3*x[k]*sd[k], 1e3*sd[k]*np.sqrt(V[k, k])))
    f.write('straying cents,%.5f,0\nweight of the wild reading,%.5f,0\n' % (stray, w.min()))
