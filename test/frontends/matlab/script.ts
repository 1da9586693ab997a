/** A script of our own with most of what the front end meets: small enough for every prefix of it to be parsed. */
export const script = `% Settling tank, first sizing
%  H : water depth [m]

%% given
g = 9.81;      % [m/s^2]
Q = 0.35       % [m^3/s] mean flow
rho_s = 2650; nu = 1e-6;  % both
sizes = [0.1, ... % [mm] fine
         0.3];    % [mm] coarse
tank = struct('width', 4.0, ... % [m]
              'depth', 3.2);
hold on
format long; close all, clear tmp
%{
left over [m]
%}
if g > 9 && ~isempty(sizes) || Q ~= 0
  v = settle(sizes(1)*1e-3, rho_s)';  # [m/s]
elseif Q, disp 'none'
else
  error('no flow: %g', Q)
end
for k = 1:numel(sizes) v(k) = sizes(k)^2; end
do
  Q += 0.1; k++;
until Q > 1
try, A = Q/v(1); catch err, disp(err.message); end
switch lower(mode)
  case {'a', "b"}
    z = @(x) x.^2 + 1;
  otherwise
    z = [1 -2; 3 - 4 v(end)'];
end
unwind_protect
  x.(name) = c{2}(3);
unwind_protect_cleanup
  [m, ~] = max(abs(v(:)), [], 2);
end_unwind_protect
x = 1;
y = 2;
x = 1;

function [v, Re] = settle(d, rho_s, varargin)
% SETTLE  velocity after Stokes
%   d     - grain size [m]
%   rho_s - density of the grain [kg/m^3]
  global water
  if nargin < 2, rho_s = 2650; end
  % (quartz)

  v = 9.81*(rho_s/998 - 1)*d.^2/(18*1e-6);  % [m/s]
  Re = number(v);
  function r = number(w)
    r = w*d/1e-6;
  end
  % end
end

function q = flow(v, A)
  arguments
    v (1,1) double {mustBePositive}  % [m/s] velocity
    A double = 0.5                   % [m^2]
  end
  q = v*A;
  return
end
`;

/** A class, in a file of its own. */
export const classFile = `classdef Tank < handle
  % TANK  a tank
  properties (Access = public)
    width (1,1) double = 4.0   % [m] clear width
    depth                      % [m]
  end
  events
    Filled
  end
  methods
    function obj = Tank(width)
      obj.width = width;
    end
    function A = area(obj, depth)
      A = obj.width*depth;
    end
    function p = double_area(obj)
      p = 2*obj.area(obj.depth);
    end
  end
  methods (Static)
    function r = ratio(a, b), r = a/b; end
  end
end
`;
