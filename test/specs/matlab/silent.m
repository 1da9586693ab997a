% Right and usual MATLAB and Octave: nothing may be reported here.

% ==== Script with commands ====
clear all; close all; clc
format long
pkg load statistics
L = 2;           % [m]
t = 4;           % [s]
v = L/t          % [m/s]
figure; hold on
plot(t, v, 'o'); grid on, axis equal
xlabel('t [s]'); ylabel("v [m/s]");
print -dpng speed.png

% ==== Transposes and texts ====
a = [1 2 3]';    % [m]
b = [4 5 6]';    % [N]
W = a'*b;        % [J]
s = ['work in J: ' num2str(W) ' (3'' long)'];
disp(s'), c = a.';
fprintf('%g m [m/s]\n', a');

% ==== Elements side by side ====
p = 3;           % [Pa]
q = 4;           % [Pa]
M = [p -q; p - q, q];      % [Pa]
N = [p' q'];               % [Pa]
K = [M; N];                % [Pa]
r = [p, ...                % [Pa]
     q];

% ==== A state vector ====
function dy = pendulum(t, y)
% PENDULUM  angle and angular speed
g = 9.81;                  % [m/s^2]
l = 0.8;                   % [m]
dy = [y(2); -g/l*sin(y(1))];
end

% ==== Missing values ====
SA = [34 35];              % [g/kg]
CT = [10 12];              % [degC]
p = [0 100];               % [dbar]
ok = ~isnan(SA + CT + p);
SA(~ok) = NaN;
CT(CT < 0) = NaN;
n = sum(~ok);

% ==== Blank arrays copied ====
n = 10;
T = NaN(n, 1);             % [degC]
q = T;                     % [W]
h = q;                     % [W/m^2]
x = zeros(n, 3);           % [m]
v = zeros(size(x));        % [m/s]

% ==== Defaults by nargin ====
function Q = flow(D, V, rho)
% Q = flow(D, V) or flow(D, V, rho)
%   D - inside diameter [m]
%   V - velocity [m/s]
%   rho - density [kg/m^3]
% Returns:
%   Q - mass flow [kg/s]
if nargin < 3 || isempty(rho)
  rho = 998;
end
if ~exist('V', 'var'), V = 1.5; end
Q = rho*V*pi*D.^2/4;
end

% ==== Options in cells and names ====
function y = pick(x, varargin)
% x - length [m]
% y - length [m]
opts = struct('Scale', 1, 'Label', 'none');
for k = 1:2:numel(varargin)
  opts.(varargin{k}) = varargin{k + 1};
end
y = opts.Scale*x;
c = {x, 'length', @(z) z + x};
end

% ==== Brackets that are no units ====
data = rand(13, 36);       % [13 x 36 double] readings
list = {'a', 'b'};         % [a, b]
mode = 2;                  % [0, 1, 2]
name = 'mixer [A]';        % [text]
k = 3;                     % see [1], [2]
x = size(data);            % [rows, columns]

% ==== Lengths of vectors ====
if true
  nl = 60;                 % number of layers
  Ps = ones(nl + 1, 1);    % [nl+1] share
  R = 3*Ps(1:nl);          % [nl]
  S = sum(R);              % [1]
  E = 400;                 % [W/m^2]
  q = E*S;                 % [W/m^2]
end

% ==== A number that stands for a unit ====
unit = 1e-3;               % all lengths in mm
d = 40;                    % [mm]
d_m = d*1e-3;              % [m]

% ==== Conversions ====
D_mm = 50;                 % [mm]
D = D_mm/1000;             % [m]
n = 1450;                  % [rpm]
omega = n*2*pi/60;         % [rad/s]
T = 68;                    % [degF]
T_C = (T - 32)/1.8;        % [degC]
T_K = T_C + 273.15;        % [K]
p_bar = 2.5;               % [bar]
p = p_bar*1e5;             % [Pa]
x = 40 - T_C;
y = 3/x;

% ==== Ranges of bare numbers ====
y = [3 5 4];               % [m]
t = 0:numel(y) - 1;        % [s]
v = diff(y)./diff(t);      % [m/s]
x = 0:10;                  % [m]
dx = 0.5;                  % [m]
n = numel(x);
for k = 1:n
  z = k*dx;                % [m]
end

% ==== Products of arrays ====
A = [2 1; 1 3];            % [N/m]
F = [10; 5];               % [N]
u = A\F;                   % [m]
W = 0.5*u'*A*u;            % [J]
n2 = norm(u);              % [m]
P = dot(F, u);             % [J]

% ==== First and further results ====
t = [3 1 2];               % [s]
[t_max, i] = max(t);
[t_sorted, order] = sort(t);
[m, n] = size(t);
dt = t_max - t_sorted(end);
t(i) = t_max/2;
x = t(order(1)) + min(t, [], 2);
[~, last] = min(abs(t - 2));

% ==== Loops ====
dt = 0.1;                  % [s]
t = 0;
k = 0;
do
  t += dt;
  k++;
until t > 10
while t < 20
  t = t + dt;              % [s]
endwhile
for tau = 0:dt:t           % [s]
  if tau > 3*dt, break, end
end

% ==== Errors and clean-up ====
fid = fopen('log.txt');
unwind_protect
  x = fscanf(fid, '%g');   % [m]
unwind_protect_cleanup
  fclose(fid);
end_unwind_protect
try
  y = x(1)/2;              % [m]
catch err
  y = 0;
  disp(err.message);
end_try_catch

% ==== Nested functions ====
function v = outer(d)
% d - depth [m]
% v - velocity [m/s]
  g = 9.81;                % [m/s^2]
  v = speed(d);
  function w = speed(h)
    w = sqrt(2*g*h);
  end
end

% ==== Function handles ====
rho = 998;                 % [kg/m^3]
g = 9.81;                  % [m/s^2]
p = @(z) rho*g*z;
z = 2.5;                   % [m]
p0 = p(z);                 % [Pa]
f = @sin;
I = integral(@(x) rho*g*x, 0, z);
t = cellfun(@numel, {1, [2 3]});

% ==== An output in steps ====
function p = gauge(h)
% p = pressure [kPa]
% h = depth [m]
rho = 998;                 % [kg/m^3]
g = 9.81;                  % [m/s^2]
p = rho*g*h;
p = p/1000;
end

% ==== A help block above, and one in capitals ====
% FLOW  volume flow
%   D - inside diameter [m]
%   V - velocity [m/s]
function Q = vflow(D, V)
Q = V*pi/4*D^2;            % [m^3/s]
end

function Q = mflow(rho, q)
% MFLOW  mass flow
%   RHO - density [kg/m^3]
%   Q - mass flow [kg/s]
Q = rho*q;
end

% ==== Objects ====
function A = wetted(depth)
% depth - level [m]
% A - area [m^2]
tank = struct('width', 2, 'f', @(d) d*2);
width = 2;                 % [m]
side = @(d) d*width;
A = side(depth);
h = tank.f(depth);
end

% ==== Block comments ====
%{
  V [m/s] velocity
  D [m] diameter
%}
V = 2;
D = 0.1;
Q = V*D^2;                 % [m^3/s]
%{
x = V + D;
%}

% ==== Octave's spellings ====
x = 3;                     # [m]
if (x != 2 && !(x == 4))
  y = x ** 2;              # [m^2]
endif
printf("%g\n", y);
x *= 2;
y ^= 0.5;

% ==== Cell titles and sections ====
%% Geometry
L = 3;                     % [m]
%% Loads [kN]
F = 4;                     % [kN]
M = F*L;                   % [kN m]

% ==== Empirical relations ====
% empirical: T [degC], p_sat [Pa]
p_sat = 611.2*exp(17.62*T/(243.12 + T));
T_dew = 12;                % [degC]

% ==== Quantities that a file brings ====
load readings.mat
data = importdata('flow.csv');
Q = data(:, 2);            % [L/min]
Q_SI = Q/60000;            % [m^3/s]
Q_mean = mean(Q_SI);       % [m^3/s]
s = std(Q);                % [L/min]

% ==== Global and persistent ====
function c = count(x)
% x - length [m]
global total
persistent n
if isempty(n), n = 0; end
n = n + 1;
total = total + x;
c = n;
end

% ==== Two statements on a line ====
a = 3; b = 4;              % [m]
c = a*b;

% ==== A class ====
classdef Tank < handle
  properties
    width = 2.0            % [m]
    depth                  % [m]
  end
  methods
    function obj = Tank(width, depth)
      obj.width = width;
      obj.depth = depth;
    end
    function A = area(obj)
      % A - wetted area [m^2]
      A = obj.width*obj.depth;
    end
  end
end
