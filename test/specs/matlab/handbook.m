% Textbook relations in MATLAB and Octave, each in its right form and with a usual slip. The source of a relation stands below its title.

% ==== Reynolds number ====
% White, Fluid Mechanics, 8th ed., eq. 1.24
rho = 998;          % [kg/m^3]
V = 1.8;            % [m/s]
D = 0.05;           % [m] inside diameter
mu = 1.0e-3;        % [Pa s]
nu = mu/rho;        % [m^2/s]
Re = V*D/nu;        % [-]
Re_wrong = V*D/mu;  % [-]
%          ^^^^^^ unlike-result

% ==== Darcy-Weisbach over several pipes ====
% White, Fluid Mechanics, 8th ed., eq. 6.10
f = [0.021 0.019 0.024];   % [-]
L = [12 40 8];             % [m]
D = [0.05 0.08 0.04];      % [m]
V = [1.1; 0.9; 1.4]';      % [m/s]
rho = 998;                 % [kg/m^3]
dp = f.*L./D.*rho.*V.^2/2; % [Pa]
dp_total = sum(dp);        % [Pa]
h = f.*L./D.*V.^2;         % [m]
%   ^^^^^^^^^^^^^ unlike-result

% ==== Heat flow through a wall ====
% Incropera et al., Fundamentals of Heat and Mass Transfer, 7th ed., eq. 3.5
function q = wall(k, A, T1, T2, L)
% WALL  steady conduction
%  INPUT:
%   k   =  conductivity        [ W/(m K) ]
%   A   =  area                [ m^2 ]
%   T1  =  inner temperature   [ deg C ]
%   T2  =  outer temperature   [ deg C ]
%   L   =  thickness           [ m ]
%  OUTPUT:
%   q   =  heat flow           [ W ]
q = k*A*(T1 - T2)/L;
end

function q = wall_wrong(k, A, T1, T2, L)
% WALL_WRONG  the thickness forgotten
%  INPUT:
%   k   =  conductivity        [ W/(m K) ]
%   A   =  area                [ m^2 ]
%   T1  =  inner temperature   [ deg C ]
%   T2  =  outer temperature   [ deg C ]
%   L   =  thickness           [ m ]
%  OUTPUT:
%   q   =  heat flow           [ W ]
q = k*A*(T1 - T2);
%   ^^^^^^^^^^^^^ unlike-result
end

% ==== Two outputs, one of them in another unit ====
% White, Fluid Mechanics, 8th ed., section 3.2 (volume and mass flow)
V = 2.0;                       % [m/s]
D = 80;                        % [mm]
[Q, m] = flow(V, D/1000);      % [m^3/s], [kg/s]
[Q2, m2] = flow(V, D);
%                  ^ scale-mismatch
t = Q + m;
%   ^^^^^ unlike-terms

function [Q, m] = flow(V, D)
% Inputs:
%   V - mean velocity [m/s]
%   D - inside diameter [m]
% Outputs:
%   Q - volume flow [m^3/s]
%   m - mass flow [kg/s]
rho = 998;          % [kg/m^3]
Q = V*pi/4*D^2;
m = rho*Q;
end

% ==== Pump power ====
% Çengel & Cimbala, Fluid Mechanics, 4th ed., eq. 14-3
Q = 35;                        % [m^3/h]
H = 12;                        % [m]
rho = 998;                     % [kg/m^3]
g = 9.81;                      % [m/s^2]
eta = 0.72;                    % [-]
P = rho*g*(Q/3600)*H/eta;      % [W]
P_wrong = rho*g*Q*H/eta;       % [W]
%         ^^^^^^^^^^^^^ scale-mismatch

% ==== Torque and speed ====
% Shigley's Mechanical Engineering Design, 10th ed., eq. 3-42
M = 18;                        % [N m]
n = 1450;                      % [rpm]
omega = 2*pi*n/60;             % [rad/s]
P = M*omega;                   % [W]
omega_wrong = n/60;            % [rad/s]
%             ^^^^ scale-mismatch

% ==== Angles in degrees ====
% MATLAB documentation, sind and sin
alpha = 30;                    % [deg]
F = 120;                       % [N]
Fx = F*cosd(alpha);            % [N]
Fy = F*sin(deg2rad(alpha));    % [N]
Fz = F*sin(alpha);             % [N]
%          ^^^^^ scale-mismatch
beta = atan2d(Fy, Fx);         % [deg]
gamma = atan2(Fy, Fx);         % [deg]
%       ^^^^^^^^^^^^^ scale-mismatch

% ==== Ideal gas ====
% Moran & Shapiro, Fundamentals of Engineering Thermodynamics, 8th ed., eq. 3.32
p = 101325;                    % [Pa]
R = 287.05;                    % [J/(kg K)]
T_C = 21;                      % [degC]
T = T_C + 273.15;              % [K]
rho = p/(R*T);                 % [kg/m^3]
rho_wrong = p/(R*T_C);         % [kg/m^3]
%              ^^^^^ offset-misuse

% ==== Speed of sound ====
% Moran & Shapiro, 8th ed., eq. 9.37
gamma = 1.4;                   % [-]
R = 287.05;                    % [J/(kg K)]
T = 294;                       % [K]
c = sqrt(gamma*R*T);           % [m/s]
c2 = gamma*R*T;                % [m/s]
%    ^^^^^^^^^ unlike-result

% ==== Bending of a beam ====
% Gere & Goodno, Mechanics of Materials, 8th ed., appendix H
F = 2.0e3;                     % [N]
L = 1.5;                       % [m]
E = 210e9;                     % [Pa]
b = 0.04; h = 0.06;
I = 1.2e-6;                    % [m^4]
w = F*L^3/(3*E*I);             % [m]
w_wrong = F*L^2/(3*E*I);       % [m]
%         ^^^^^^^^^^^^^ unlike-result

% ==== Stress in two units ====
% Gere & Goodno, 8th ed., eq. 1-6
F = 25;                        % [kN]
A = 314;                       % [mm^2]
sigma = F*1000/A;              % [MPa]
sigma_wrong = F/A;             % [MPa]
%             ^^^ scale-mismatch
limit = 235;                   % [MPa]
F_N = 25000;                   % [N]
if F_N > limit
%  ^^^^^^^^^^^ unlike-terms
  error('too much');
end

% ==== Critical load of a column ====
% Gere & Goodno, 8th ed., eq. 11-12
E = 210e9;                     % [Pa]
I = 3.2e-7;                    % [m^4]
L = 2.4;                       % [m]
F_cr = pi^2*E*I/L^2;           % [N]
F_wrong = pi^2*E*I/L;          % [N]
%         ^^^^^^^^^^ unlike-result

% ==== Natural frequency ====
% Rao, Mechanical Vibrations, 5th ed., eq. 2.9
k = 1.2e4;                     % [N/m]
m = 3.5;                       % [kg]
omega = sqrt(k/m);             % [rad/s]
f = omega/(2*pi);              % [Hz]
f_wrong = omega;               % [Hz]
%         ^^^^^ scale-mismatch

% ==== Capacitor and resistor ====
% Horowitz & Hill, The Art of Electronics, 3rd ed., section 1.4
R = 4700;                      % [ohm]
C = 2.2e-6;                    % [F]
t = linspace(0, 0.05, 200);    % [s]
tau = R*C;                     % [s]
U0 = 5;                        % [V]
U = U0*exp(-t/tau);            % [V]
U_wrong = U0*exp(-t*tau);      % [V]
%                ^^^^^^ dimensioned-argument

% ==== Energy of a battery ====
% common practice: 1 Wh = 3600 J
U = 12.6;                      % [V]
I = 3.1;                       % [A]
t = 2.5;                       % [h]
W = U*I*t;                     % [Wh]
W_J = U*I*t*3600;              % [J]
W_bad = U*I*t;                 % [J]
%       ^^^^^ scale-mismatch

% ==== Manning's equation carries units in its number ====
% Chow, Open-Channel Hydraulics, eq. 5-6
n = 0.013;                     % [s/m^(1/3)]
Rh = 0.35;                     % [m]
S = 0.002;                     % [-]
V = 1/n*Rh^(2/3)*sqrt(S);      % [m/s]
V_us = 1.49/n*Rh^(2/3)*sqrt(S);   % [m/s]
V_wrong = 1/n*Rh^(1/2)*sqrt(S);   % [m/s]
%         ^^^^^^^^^^^^^^^^^^^^ unlike-result

% ==== Free fall with a bare number ====
% Halliday, Resnick & Walker, Fundamentals of Physics, 10th ed., eq. 2-15
h = 1.7;                       % [m]
v = sqrt(2*9.81*h);            % [m/s]
%   ^^^^^^^^^^^^^^ hidden-unit: 9.81
g = 9.81;                      % [m/s^2]
v2 = sqrt(2*g*h);              % [m/s]

% ==== Integration with trapz ====
% MATLAB documentation, trapz: the abscissa comes first
t = 0:0.5:60;                  % [s]
P = 250 + 10*randn(size(t));   % [W]
W = trapz(t, P);               % [J]
W_wrong = trapz(t, P);         % [W]
%         ^^^^^^^^^^^ unlike-result

% ==== Slopes with diff and gradient ====
% MATLAB documentation, diff and gradient
t = 0:0.1:10;                  % [s]
x = zeros(size(t));            % [m]
v = diff(x)./diff(t);          % [m/s]
a = gradient(v, 0.1);
w = diff(x).*diff(t);          % [m/s]
%   ^^^^^^^^^^^^^^^^ unlike-result

% ==== A table interpolated ====
% MATLAB documentation, interp1
T_tab = [0 20 40 60];          % [degC]
mu_tab = [1.79 1.00 0.65 0.47];   % [mPa s]
T = 33;                        % [degC]
mu = interp1(T_tab, mu_tab, T);   % [mPa s]
mu_wrong = interp1(mu_tab, T_tab, T);
%                                 ^ unlike-terms

% ==== A root by a function handle ====
% MATLAB documentation, fzero
h0 = 0.4;                      % [m]
V = 2.1;                       % [m^3]
A = 1.6;                       % [m^2]
h = fzero(@(z) A*z - V, h0);   % [m]
h_wrong = fzero(@(z) A*z - V, h0) + V;
%         ^^^^^^^^^^^^^^^^^^^^^^^^^^^ unlike-terms

% ==== A function in a variable ====
% White, 8th ed., eq. 2.14 (hydrostatic pressure)
rho = 998;                     % [kg/m^3]
g = 9.81;                      % [m/s^2]
p = @(z) rho*g*z;
z = 2.5;                       % [m]
t = 3;                         % [s]
p_1 = p(z);                    % [Pa]
p_2 = p(t);                    % [Pa]
%     ^^^^ unlike-result

% ==== Tank that runs empty ====
% White, 8th ed., example 3.22 (Torricelli's law)
function dh = emptying(t, h)
% h - level [m]
% t - time [s]
% dh - change of level [m/s]
A = 0.8;                       % [m^2] tank
a = 4e-4;                      % [m^2] outlet
g = 9.81;                      % [m/s^2]
dh = -a/A*sqrt(2*g*h);
end

function dh = emptying_wrong(t, h)
% h - level [m]
% t - time [s]
% dh - change of level [m/s]
A = 0.8;                       % [m^2] tank
a = 4e-4;                      % [m^2] outlet
g = 9.81;                      % [m/s^2]
dh = -a*sqrt(2*g*h);
%    ^^^^^^^^^^^^^^ unlike-result
end

% ==== A loop in steps of time ====
% common practice: explicit Euler
T = 20;                        % [degC]
T_out = 5;                     % [degC]
UA = 12;                       % [W/K]
C = 4.2e5;                     % [J/K]
dt = 60;                       % [s]
for k = 1:100
  T = T - UA*(T - T_out)/C*dt;   % [degC]
  T_bad = T - UA*(T - T_out)/C;
%         ^^^^^^^^^^^^^^^^^^^^ unlike-terms
end

% ==== A structure of properties ====
% VDI Heat Atlas, 2nd ed., D2.1 (water at 20 °C)
water = struct('rho', 998, ...     % [kg/m^3]
               'cp', 4184, ...     % [J/(kg K)]
               'k', 0.60);         % [W/(m K)]
a = water.k/(water.rho*water.cp);  % [m^2/s]
b = water.k/water.cp;              % [m^2/s]
%   ^^^^^^^^^^^^^^^^ unlike-result

% ==== Fields that a script fills ====
% common practice
pipe.D = 0.05;                 % [m]
pipe.L = 12;                   % [m]
pipe.A = pi/4*pipe.D^2;        % [m^2]
pipe.V = pipe.A*pipe.L;        % [m^3]
pipe.S = pipe.A + pipe.L;
%        ^^^^^^^^^^^^^^^ unlike-terms

% ==== Arguments declared in a block ====
% MATLAB documentation, arguments
function Q = orifice(d, dp, rho)
  arguments
    d (1,1) double {mustBePositive}    % [m] bore
    dp (1,1) double = 2e4              % [Pa] pressure difference
    rho (1,1) double = 998             % [kg/m^3]
  end
  Cd = 0.61;                           % [-]
  A = pi*d^2/4;                        % [m^2]
  Q = Cd*A*sqrt(2*dp/rho);             % [m^3/s]
  v = sqrt(2*dp*rho);                  % [m/s]
%     ^^^^^^^^^^^^^^ unlike-result
end

% ==== Choice in a switch ====
% common practice
unit_D = 'in';
D = 50;                        % [mm]
switch unit_D
  case 'mm'
    D_m = D/1000;              % [m]
  case {'in', "inch"}
    D_m = D*25.4;              % [m]
%         ^^^^^^ scale-mismatch
  otherwise
    error('unknown');
end

% ==== Temperature coefficient of a rate ====
% van 't Hoff's rule; Atkins & de Paula, Physical Chemistry (from memory)
function k = rate(k20, Q10, T)
% k20 - rate at 20 degC [1/s]
% Q10 - temperature coefficient [-]
% T - temperature [degC]
% k - rate [1/s]
T20 = 20;                      % [degC]
k = k20*Q10^((T - T20)/10);
%            ^^^^^^^^^^^^ hidden-unit
end

% ==== A note that cannot be read ====
% NIST SP 811, section 6.1
mu = 0.42;                     % [kg/(m s]
%                                    ^ unreadable-unit
